/** A file that can be saved from a result: at an address, or made by this page. */
export interface ExportFile {
  /** What the button says: a verb, and the thing. */
  label: string;
  /** What the file is, in a line. */
  what: string;
  href?: string;
  save?: () => Promise<void>;
}

type Kind = 'bundle' | 'document' | 'print' | 'numbers' | 'distribution' | 'tails';

/** Each file in words, the same wherever it is offered. */
export const EXPORTS: Record<Kind, Pick<ExportFile, 'label' | 'what'>> = {
  bundle: {
    label: 'Save everything as a zip',
    what: 'All of these, the charts and the counts, with a README that says how to compute the report again.'
  },
  document: {
    label: 'Save the document as JSON',
    what: 'The report itself, byte for byte. Everything else follows from it.'
  },
  print: { label: 'Save the report as PDF', what: 'The report on A4, charts and tables in it.' },
  numbers: { label: 'Save its numbers as CSV', what: 'Every number, one a line, with its interval.' },
  distribution: {
    label: 'Save the distribution as CSV',
    what: 'A row a count: shots, share with its interval, best law.'
  },
  tails: {
    label: 'Save the tails as CSV',
    what: 'A row a tail: shots, share with its interval, best law, bounds.'
  }
};
