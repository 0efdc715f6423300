/** What `sweep --help` prints. */
export const help = `How do the cumulants of defect counts follow quench time, or hold time?

Usage: npm run --silent sweep -- FILE [options]
       FILE is a table with a time beside each count, or - for standard input:
       one dataset for each time.

  --axis quench | hold     which time is swept (default quench)
  --unit defect | pair     pair: counts are even, and pairs are taken
  --from T, --to T         window of the power laws, in the unit of the file's
                           first time; both ends included
  --transition D,NU,Z      compares with d\u03bd/(1 + z\u03bd)
  --alpha 0.05             level at which one exponent is refused

  --text                   the answer in words (default)
  --json                   the sweep document, and nothing else
  --help

Exit codes: 0 done, 1 internal error, 2 bad input or options.
`;
