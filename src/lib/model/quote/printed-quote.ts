import { toPlain } from './notation/to-plain';
import { quoteOf, type Quote } from './quote-of';

/** A quote with its words written out in plain text, so that a page can show it without what wrote it. */
export interface PrintedQuote extends Quote {
  plain: { result: string; methods: string };
}

/** Made by the server for the pages of stored reports: words and rules of rounding are 9 kB that a reader need not load. */
export function printedQuote(...of: Parameters<typeof quoteOf>): PrintedQuote {
  const quote = quoteOf(...of);
  return { ...quote, plain: { result: toPlain(quote.result), methods: toPlain(quote.methods) } };
}
