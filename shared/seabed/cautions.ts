/** Cautions that belong to a seabed, in the words the product always uses. */

export const mudCaution = 'Mud was pulled within minutes. A long soak may raise holding; a long blow may lower it.'

export const protectedCaution = 'Seagrass and coral: anchoring is forbidden in many places and harmful in all. Local rules come first.'

export const shiftCaution = 'A wind shift, weed on the point or a stone in the fluke can undo a good set. Check after every shift.'

export const noNumberCaution = 'No holding figure is given here: what an anchor does on this bottom is chance, not holding.'
