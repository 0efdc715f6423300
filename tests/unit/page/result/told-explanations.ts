import { EXPLANATIONS } from '$lib/model/labels';
import type { Explanation } from '$lib/stats/explanations/types';
import { NUMBER, printed, unlike } from './same-digits';

/**
 * What is wrong with the explanations as they are printed, a list of cells each: name, AIC behind, weight, p of its fit,
 * and its own number with interval; '' where independent trials have none. What a rejected fit says stands after the
 * weight on the page and before the number in print.
 */
export function wrongExplanations(rows: string[][], ranked: Explanation[], alpha: number): string[] {
  if (rows.length !== ranked.length) return [`${rows.length} rows, not ${ranked.length}`];
  return ranked.flatMap((one, i) => {
    const { id, behind, weight, goodness, parameter, second } = one;
    const [name, far, weighed, fit, numbered] = rows[i];
    const [share, ...besides] = weighed.split(/(?<=%)\s*(?=[a-z])/);
    const [first, ...rest] = numbered.split('; ');
    const before = first.endsWith('fit') ? first.toLowerCase() : '';
    const own = before === '' ? numbered : rest.join('; ');
    const told = besides[0] ?? before;
    const wrong = [
      told === unfit(one, alpha) ? '' : `"${told}" of its fit`,
      name.replace(/^tied: /, '') === EXPLANATIONS[id] ? '' : `"${name}"`,
      unlike(far, behind, 3),
      wrongWeight(share, weight),
      unlike(fit, goodness?.p ?? null, 2)
    ];
    const values = parameter === null ? [] : [parameter.value, parameter.low, parameter.high];
    const digits = [3, 3, 3, ...(second ? [2] : [])];
    const said = own.replace(/\(95 %: /, '(').match(new RegExp(NUMBER, 'g')) ?? [];
    const wanted = [...values, ...(second ? [second.value] : [])];
    wrong.push(said.length === wanted.length ? '' : `${said.length} numbers in "${own}"`);
    wanted.forEach((value, j) => wrong.push(unlike(said[j] ?? 'nothing', value, digits[j])));
    if (parameter && !own.startsWith(`${parameter.symbol} = `))
      wrong.push(`no ${parameter.symbol} in "${own}"`);
    return wrong.filter((one) => one !== '').map((one) => `${id}: ${one}`);
  });
}

/** What must stand beside an explanation that its own fit rejects, by the level of the answer. */
export function unfit({ goodness, behind }: Explanation, alpha: number): string {
  if (goodness === null || goodness.p > Math.max(alpha, goodness.smallestP)) return '';
  return behind > 0 ? 'does not fit' : 'best of these, and does not fit';
}

function wrongWeight(said: string, weight: number): string {
  const shown = said.replace(/ ?%$/, '');
  if (shown === '< 0.1') return weight < 0.001 ? '' : `"${said}" for ${weight}`;
  if (shown === '> 99.9') return weight > 0.999 ? '' : `"${said}" for ${weight}`;
  const { value, unit } = printed(shown);
  return Math.abs(value - 100 * weight) <= unit * (0.5 + 1e-6) ? '' : `"${said}" for ${weight}`;
}

/** Cells of the PDF that stand after the head of the explanations, a list each: the number has a row of its own. */
export function explanationsOfPdf(cells: string[], ranked: Explanation[], alpha: number): string[][] {
  const heads = ['explanation', 'AIC behind', 'weight', 'p of its fit'];
  const at = cells.findIndex((_, i) => heads.every((head, j) => cells[i + j] === head));
  if (at < 0) return [];
  const tied = cells[at + heads.length] === 'tied' ? 1 : 0;
  let i = at + heads.length + tied;
  return ranked.map((one) => {
    const row = cells.slice(i, i + heads.length);
    i += heads.length + tied;
    return [...row, one.parameter === null && unfit(one, alpha) === '' ? '' : cells[i++]];
  });
}
