import { escapeMarkup } from './escape-markup';
import { DOWNLOAD_INKS, FACES } from './inks';

/** How a version stands; `no-rule` where its device has no rule, or nothing is there to judge. */
export type Standing = 'passed' | 'failed' | 'undecided' | 'no-rule';

/** Those of the light page: a badge stands on pages that know nothing of night. */
const { paper: PAPER, ink: INK, oxide: OXIDE, brass: BRASS } = DOWNLOAD_INKS;
const SAID: Record<Standing, string> = {
  passed: 'passed',
  failed: 'failed',
  undecided: 'undecided',
  'no-rule': 'no gate'
};
/** The signs of answers: shape and word say it, never colour alone. */
const SIGNS: Record<Standing, string> = {
  passed: `<circle cx="6" cy="6" r="3.5" fill="${INK}"/>`,
  failed: `<path d="M6 1L11.5 11H0.5Z" fill="${OXIDE}"/>`,
  undecided: `<path d="M6 1L11 6L6 11L1 6Z" fill="${PAPER}" stroke="${BRASS}" stroke-width="2"/>`,
  'no-rule': `<path d="M2 6H10" stroke="${INK}" stroke-width="2"/>`
};
const INKS: Record<Standing, string> = { passed: INK, failed: OXIDE, undecided: BRASS, 'no-rule': INK };
/** Letters of a fixed-width face are held to this width, whichever the reader has. */
const LETTER = 7.2;
const MOST = 40;

/** The gate of a version as a small picture: its name, a sign and the word over a rule in the ink of the outcome. */
export function gateBadge(version: string, standing: Standing): string {
  const letters = [...version];
  const name = letters.length > MOST ? `${letters.slice(0, MOST - 1).join('')}…` : version;
  const word = SAID[standing];
  const widthOf = (words: string) => Number(([...words].length * LETTER).toFixed(1));
  const [nameWidth, wordWidth] = [widthOf(name), widthOf(word)];
  const [sign, said] = [nameWidth + 18, nameWidth + 34].map((x) => Number(x.toFixed(1)));
  const width = Number((said + wordWidth + 8).toFixed(1));
  const face = `font-family="${FACES.number.family}" font-size="12"`;
  const text = (x: number, length: number, ink: string, words: string, weight = 400) =>
    `<text x="${x}" y="16" textLength="${length}" lengthAdjust="spacingAndGlyphs" font-weight="${weight}" fill="${ink}">${escapeMarkup(words)}</text>`;
  const label = escapeMarkup(`Gate of ${name}: ${word}`);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}" height="26" viewBox="0 0 ${width} 26" role="img" aria-label="${label}">`,
    `<title>${label}</title><rect width="${width}" height="26" fill="${PAPER}"/>`,
    `<g ${face}>${text(8, nameWidth, INK, name)}${text(said, wordWidth, INKS[standing], word, 700)}</g>`,
    `<g transform="translate(${sign} 6)">${SIGNS[standing]}</g>`,
    `<path d="M0 25H${width}" stroke="${INKS[standing]}" stroke-width="2"/></svg>`
  ].join('');
}
