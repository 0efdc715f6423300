const MB = 1024 * 1024;

/** What an archive may hold. An archive has at most 65 535 entries without the wider form of zip, which we do not write. */
export const LIMITS = {
  entries: 65_000,
  /** Bytes of one file, unpacked; an original file has at most 20 MB. */
  file: 64 * MB,
  /** Bytes of all, unpacked: they are held in memory while they are checked. */
  total: 256 * MB,
  /** Files above this size may not be packed more tightly than `ratio` to one; we store those that would be. */
  ratioFrom: MB,
  ratio: 100
};

/** A folder of an archive counts to here, in five digits. */
export const MOST_NUMBERED = 30_000;
