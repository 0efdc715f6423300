/** Text of `--help`. */
export const help = `Do counts of defects behave as a sum of independent events?

Usage: npm run --silent diagnose -- FILE [options]
       FILE is a histogram, a shot list or JSON; - reads standard input.

The experiment
  --trials N | unknown     largest possible count: sites, bonds or modes
  --unit defect | pair     pair: counts are even, and pairs are tested
  --geometry sites | open-bonds | ring-bonds
  --misread P              probability that one site is misread; allowed for in every test of
                           single kinks on open-bonds or ring-bonds with N known
  --misread-uncertainty U  standard uncertainty of P, from its calibration
  --kept FROM-TO           only counts from FROM to TO were kept, the rest dropped;
                           1- where only empty shots were
  --supplied FILE          probabilities of a law to compare with
What the file itself states (JSON, or a column "trials") is used when these are left out.

How hard to look
  --alpha 0.01             level of the answer
  --tolerance 0.1          excess of variance over the ceiling that would matter
  --resamples 1999         resampled histograms at most
  --seed 1                 seed of every random draw

How to read the file; whatever is left out is guessed, and the guess is shown
  --format auto | counts | shots | positions | json
  --separator comma | semicolon | tab | spaces | none
  --header yes | no
  --decimal point | comma
  --thousands none | comma | point
  --encoding utf-8 | utf-16le | utf-16be | windows-1252
  --count-column C         C is a name, or a number from 1
  --shots-column C         number of shots with that count
  --shot-column C          number of one shot, in a shot list
  --batch-column C         may be given several times, as the next two
  --condition-column C     one dataset for each value
  --ignore-column C
  --dataset NAME           which dataset, when the file holds several

What to print
  --text                   the answer in words (default)
  --json                   the diagnosis document, and nothing else
  --csv                    every number of it as a table, and nothing else
  --pdf FILE               also writes the report, for print
  --bundle FILE            also writes everything as a zip, with a README that
                           says how to compute it again
  --quiet                  no remarks on standard error
  --fail-on ruled-out | undecided
                           end with code 3 on that answer (undecided: or ruled out)
  --help

Exit codes: 0 done, 1 internal error, 2 bad input or options, 3 the answer of --fail-on.
`;
