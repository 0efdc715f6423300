import { EXPLANATIONS } from '$lib/model/labels';
import type { Explanation } from '$lib/stats/explanations/types';
import { NUMBER, printed, unlike } from './same-digits';

/**
 * What is wrong with the explanations as they are printed, a list of cells each: name, AIC behind, weight, p of its fit,
 * and its own number with interval; '' where independent trials have none.
 */
export function wrongExplanations(rows: string[][], ranked: Explanation[]): string[] {
  if (rows.length !== ranked.length) return [`${rows.length} rows, not ${ranked.length}`];
  return ranked.flatMap(({ id, behind, weight, goodness, parameter, second }, i) => {
    const [name, far, share, fit, own] = rows[i];
    const wrong = [
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

function wrongWeight(said: string, weight: number): string {
  const shown = said.replace(/ ?%$/, '');
  if (shown === '< 0.1') return weight < 0.001 ? '' : `"${said}" for ${weight}`;
  if (shown === '> 99.9') return weight > 0.999 ? '' : `"${said}" for ${weight}`;
  const { value, unit } = printed(shown);
  return Math.abs(value - 100 * weight) <= unit * (0.5 + 1e-6) ? '' : `"${said}" for ${weight}`;
}

/** Cells of the PDF that stand after the head of the explanations, a list each: the number has a row of its own. */
export function explanationsOfPdf(cells: string[], ranked: Explanation[]): string[][] {
  const heads = ['explanation', 'AIC behind', 'weight', 'p of its fit'];
  const at = cells.findIndex((_, i) => heads.every((head, j) => cells[i + j] === head));
  if (at < 0) return [];
  const tied = cells[at + heads.length] === 'tied' ? 1 : 0;
  let i = at + heads.length + tied;
  return ranked.map(({ parameter }) => {
    const row = cells.slice(i, i + heads.length);
    i += heads.length + tied;
    return [...row, parameter === null ? '' : cells[i++]];
  });
}
