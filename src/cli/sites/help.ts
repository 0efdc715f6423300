/** What `sites --help` prints. */
export const help = `Which pairs of sites are correlated in site-resolved shots?

Usage: npm run --silent sites -- FILE [options]
       FILE has one row a shot: a 0 or 1 for each site, or one string of bits;
       - for standard input.

  --geometry chain | ring  how the sites are neighbours (default chain)
  --seek any | rise        rise: only a positive correlation is looked for,
                           neighbours before all others; to be declared before
                           the data are seen (default any)
  --alpha 0.05             chance of any false alarm among all pairs

  --text                   the answer in words (default)
  --json                   the map as a document, and nothing else
  --help

Exit codes: 0 done, 1 internal error, 2 bad input or options.
`;
