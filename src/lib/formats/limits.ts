/** Largest file read unless the caller says otherwise: 20 MB. */
export const defaultMaxBytes = 20 * 1024 * 1024;

/** Rows of a table, or values of a JSON text; about 300 MB of memory while they are read. */
export const defaultMaxRows = 2_000_000;

/** Columns of a table. */
export const maxColumns = 1000;

/** Datasets in one file; more means that a column was taken for a condition and is not one. */
export const maxDatasets = 1000;

/** Largest single count: what one cell of a `Uint32Array` holds. */
export const maxCount = 2 ** 32 - 1;

/** Largest number of shots, one by one and summed: beyond it whole numbers are no longer exact. */
export const maxShots = 2 ** 53;

/** Levels of brackets in JSON; what is read here needs four. */
export const maxDepth = 64;
