/** A4 in points, with a main column and a margin column as on the page. */
export const PAGE = {
  width: 595.28,
  height: 841.89,
  left: 51,
  top: 46,
  /** Last line that text may reach. */
  bottom: 784,
  /** Baseline of the page number. */
  foot: 808,
  main: 348,
  note: 396 + 27,
  noteWidth: 132,
  whole: 504
} as const;
