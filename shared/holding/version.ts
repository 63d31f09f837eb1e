/** Name of the model and its solver. It changes whenever the same pulls would give other figures. */
export const modelVersion = 'holding-1'
