// The document's own sentences are written with these, so they live with the engine; pages use them from here.
export { formatCount, formatNumber, formatPercent } from '$lib/stats/words/format-number';
