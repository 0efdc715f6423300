/** The smallest p told of neighbouring shots: their sum is not normal further out. */
export const surest = 1e-9;
