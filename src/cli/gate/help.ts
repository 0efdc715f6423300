/** What `gate --help` prints. */
export const help = `Does a firmware version pass its gate?

Usage: npm run --silent gate -- FILE... --version V --reference R [options]
       FILES are tables with the firmware version, and the group if there are
       several, beside each count; - for standard input.

  --version V              the version that is judged
  --reference R            the version it is held against
  --tolerance 0.1          excess of variance over the ceiling that is allowed
  --alpha 0.05             how often a version without any excess or rise may
                           fail by chance, at most
  --group G                only this group; may be given several times
  --device D               only this device, where the files name several
  --trials N               largest possible count, where the files do not say it

  --text                   the answer in words (default)
  --json                   the gate document, and nothing else
  --help

Exit codes: 0 passed, 1 failed, 2 bad input or options, 3 undecided, 4 internal error.
`;
