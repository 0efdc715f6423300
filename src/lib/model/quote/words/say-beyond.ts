import type { Quotable } from '../quotable';
import { text, words, type Words } from '../span';
import { percent, whole } from './say-number';

/** What the answer does not show: how small an excess was in reach, how many shots would decide, other causes. */
export function sayBeyond(quotable: Quotable): Words[] {
  const { answer, flags } = quotable;
  const { verdict, smallestExcess, shotsToDecide } = answer;
  const out: Words[] = [];
  if (verdict === 'ruled-out') return [otherCauses(quotable)];
  if (smallestExcess !== null)
    out.push(
      words`So many shots show an excess of ${percent(smallestExcess)} over the ceiling in four of five repeats, by the variance alone at a level of 5\u202f%.`
    );
  if (verdict === 'undecided') {
    if (shotsToDecide !== null)
      out.push(
        words`If the variance stays where it is now, about ${whole(shotsToDecide)} shots in all would decide.`
      );
    return out;
  }
  if (flags.some(({ id }) => id === 'regular'))
    out.push([
      text(
        'The counts are more regular than equal trials make them, which uneven probabilities give, and repulsion between defects as well.'
      )
    ]);
  out.push([
    text('Compatible is not the same as independent: some interacting systems give exactly such counts.')
  ]);
  return out;
}

/** Causes other than interaction, in the document's own words, each told once. */
function otherCauses({ flags }: Quotable): Words {
  const raised = flags.filter(({ id }) => id !== 'regular');
  const shown = raised.filter(({ grade, id }) => grade === 'shown' || id === 'misreads');
  const causes = (shown.length > 0 ? shown : raised).flatMap(({ id, otherCauses }) =>
    // The other cause of misreads is bunching, which is what is in question here.
    id === 'misreads' ? ['misread sites, each of which toggles two neighbouring bonds'] : otherCauses
  );
  if (causes.length === 0)
    return [
      text(
        'This does not tell the cause: anything that ties the defects of a shot together, or makes one shot differ from the next, gives such counts.'
      )
    ];
  return [
    text(
      `This does not tell the cause. It could be interaction between defects, or one of these: ${[...new Set(causes)].join('; ')}.`
    )
  ];
}
