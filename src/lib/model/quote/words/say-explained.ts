import { EXPLANATIONS } from '../../labels';
import { rejected } from '$lib/stats/explanations/rejected';
import type { Explanation, ExplanationId, Explanations } from '$lib/stats/explanations/types';
import { asGiven } from '../numbers/as-given';
import type { Quotable } from '../quotable';
import { listed, number, text, words, type Words } from '../span';
import { sayPValue, sayRounded } from './say-number';

const independent = (id: ExplanationId): boolean => id === 'equal-trials' || id === 'best-independent';

/**
 * Where independence is ruled out, one sentence of which story leads, with its number and how it fits, and which cannot
 * be told from it; nothing where no story was told.
 */
export function sayExplained({ answer, engine, explanations }: Quotable): Words[] {
  if (answer.verdict !== 'ruled-out' || !explanations) return [];
  const { ranked, tied } = explanations;
  if (!ranked.some(({ id }) => !independent(id))) return [];
  const [first] = ranked;
  const shares = first.id === 'two-settings' ? ', of equal shares' : '';
  if (tied.some(independent))
    return [[text('None of the stories fitted describes the counts better than independent trials do.')]];
  const fails = rejected(first, engine.alpha);
  return [
    words`Of the explanations fitted, the nearest to the counts by AIC is ${EXPLANATIONS[first.id]}${shares}${itsNumber(first)}${fails ? '; yet it does not fit them either' : ''}${atPar(explanations)}.`
  ];
}

/** ", with ρ = 0.016 (95 % interval 0.015 to 0.017) and p = 0.65 for its own fit". */
function itsNumber({ parameter, goodness }: Explanation): Words {
  if (parameter === null) return [];
  const { symbol, value, low, high } = parameter;
  const own =
    symbol.length === 1
      ? sayRounded({ value, low, high }, symbol)
      : words`${symbol} ${sayRounded({ value, low, high })}`;
  const fit = goodness
    ? words` and ${sayPValue(goodness.p, goodness.p <= goodness.smallestP)} for its own fit`
    : [];
  return words`, with ${own}${fit}`;
}

function atPar({ ranked, tied, tieWithin }: Explanations): Words {
  const others = ranked.slice(1).filter(({ id }) => tied.includes(id));
  if (others.length === 0) return [];
  const names = listed(others.map(({ id }) => EXPLANATIONS[id]));
  return words`; less than ${number(asGiven(tieWithin))} behind, and not to be told from it by these shots: ${names}`;
}
