/** Every display mode and width is audited by `npm run test:long`; every run audits by day, at the narrowest width. */
const long = process.env.KEDGEWISE_LONG === '1'

export const modes = long ? ['day', 'night', 'sun'] as const : ['day'] as const
export const widths = long ? [320, 360, 768] as const : [320] as const
