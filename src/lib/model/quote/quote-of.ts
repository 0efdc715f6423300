import type { Diagnosis } from '$lib/stats/types';
import type { Summary } from '../link/summary';
import { bibtex } from './citation/bibtex';
import type { Provenance } from './provenance';
import { quotableOf, type Quotable } from './quotable';
import { quotableOfSummary } from './quotable-of-summary';
import type { Words } from './span';
import { methodsWords } from './words/methods-words';
import { resultWords } from './words/result-words';

/** Words of a report for a paper; `inNotation` writes the first two out. */
export interface Quote {
  result: Words;
  methods: Words;
  bibtex: string;
}

/**
 * What may be quoted of a document: its result in a few sentences, the methods paragraph, and an entry to cite it by.
 *
 * Every number is the document's, rounded: to its uncertainty where it has an interval (JCGM 100:2008, 7.2.6), a
 * p-value to two digits. Nothing is computed anew.
 *
 * @param document a whole document, or the summary of a link that keeps the counts back
 */
export function quoteOf(document: Diagnosis | Summary, provenance: Provenance): Quote {
  const quotable: Quotable =
    document.format === 'severalty.summary/1' ? quotableOfSummary(document) : quotableOf(document);
  return {
    result: resultWords(quotable),
    methods: methodsWords(quotable, provenance),
    bibtex: bibtex(quotable, provenance)
  };
}
