import { GEOMETRIES } from '../../labels';
import type { Provenance } from '../provenance';
import type { Quotable } from '../quotable';
import { code, equation, joined, nameOf, text, words, type Words } from '../span';
import { asGiven } from '../numbers/as-given';
import { counted, givenPercent, whole } from './say-number';
import { testedTrials } from './units';

/** Program, counts, trials, unit and read-out, a sentence each. */
export function sayGiven(quotable: Quotable, provenance: Provenance): Words[] {
  const { data, engine } = quotable;
  return [
    words`Whether the counts can be sums of independent trials was tested with Severalty, engine ${engine.version}.`,
    words`The data${named(provenance)} are the counts of ${counted(data.shots, 'shot')}${trials(quotable)}.`,
    ...(data.digest
      ? [words`The sha256 of the histogram is ${code(data.digest.replace(/^sha256:/, ''))}.`]
      : []),
    ...opening(quotable),
    ...lump(quotable),
    ...order(quotable),
    ...cut(quotable),
    ...readOut(quotable)
  ];
}

function named({ name, device, firmware, group }: Provenance): Words {
  const of = [
    name === null ? '' : words` “${nameOf(name)}”`,
    group === null ? '' : words` of group ${nameOf(group)}`,
    device === null ? '' : words` from ${nameOf(device)}`,
    firmware === null ? '' : words` with firmware ${nameOf(firmware)}`
  ];
  const all = joined(of);
  return all.length > 0 ? words`,${all},` : [];
}

function trials(quotable: Quotable): Words {
  const { data } = quotable;
  const on = data.geometry === 'sites' ? '' : `, counted on ${GEOMETRIES[data.geometry]}`;
  const tested = testedTrials(quotable);
  if (tested === null)
    return words`${on}; the number of trials in a shot was taken as unknown${data.unit === 'pair' ? ', and defects were counted in pairs' : ''}`;
  const given = words`${on}, ${data.shots === 1 ? '' : 'each '}of ${equation('N', '=', asGiven(data.trials!))} trial${data.trials === 1 ? '' : 's'}`;
  return data.unit === 'pair'
    ? words`${given}; defects come in pairs, so the number of pairs out of ${whole(tested)} was tested`
    : given;
}

function lump({ data }: Quotable): Words[] {
  if (!data.lump) return [];
  const { from } = data.lump;
  if (from === null)
    return [
      [
        text(
          `The largest counts were given as one row; mean and variance take its first count${data.opening ? '' : ' and are lower limits'}.`
        )
      ]
    ];
  return [
    words`Counts of ${whole(from)} and more were given as one row: they enter the likelihood as a tail, and mean and variance take each such shot as ${whole(from)}${data.opening ? '' : ' and are lower limits'}.`
  ];
}

function opening({ data }: Quotable): Words[] {
  if (!data.opening) return [];
  const { to } = data.opening;
  return [
    to === null
      ? [text('The smallest counts were given as one row; mean and variance take its last count.')]
      : words`Counts of ${whole(to)} and fewer were given as one row: they enter the likelihood as a sum of the law, and mean and variance take each such shot as ${whole(to)}.`
  ];
}

function order({ data }: Quotable): Words[] {
  if (!data.ordered) return [];
  return [
    data.batches === null
      ? [text('The order of the shots was known.')]
      : words`The order of the shots was known, in ${counted(data.batches, 'batch', 'batches')}.`
  ];
}

/** A cut changes every law and the ceiling, so it is told with what was given. */
function cut({ data }: Quotable): Words[] {
  const { kept } = data;
  if (!kept) return [];
  const range =
    kept.to === null
      ? words`counts of ${whole(kept.from)} and more`
      : words`counts from ${whole(kept.from)} to ${whole(kept.to)}`;
  return [
    words`Only ${range} were kept, the other shots having been dropped; the best law, the ceiling and the tests are of independent trials so cut, and no certificate is given.`
  ];
}

function readOut({ data }: Quotable): Words[] {
  if (data.misread) {
    const stated = words`A chance of ${givenPercent(data.misread)} to misread a site was stated`;
    if (data.misreadApplied)
      return [
        words`${stated}, the same at every site and independent of the others; law, ceiling, bounds and tests are of independent kinks read with it.`,
        ...(data.misreadUncertainty
          ? [
              words`Its standard uncertainty is ${givenPercent(data.misreadUncertainty)}; every p is the largest over the interval that leaves, plus the chance that the rate lies outside (Berger and Boos 1994).`
            ]
          : [])
      ];
    // Misread one by one, sites still give a sum of independent trials.
    if (data.geometry === 'sites')
      return [
        words`${stated}; misread one by one, sites still give counts that are sums of independent trials.`
      ];
    return [words`${stated}; the tests are against laws without misreads.`];
  }
  return data.geometry === 'sites'
    ? []
    : [[text('No chance to misread a site was stated, and none is corrected for.')]];
}
