/** Sites in one shot: all their pairs, 523 776, are still tested at once. */
export const maxSites = 1024;

/** Bytes that the packed shots may take, 64 MB: half a million shots of 1024 sites. */
export const maxPackedBytes = 64 * 1024 * 1024;

/** Bytes of a file that the server maps while somebody waits, 4 MB: 5000 shots of 128 sites with separators take 1.3. */
export const maxMapBytes = 4 * 1024 * 1024;
