import type { OthersChange } from '$lib/model/team/datasets/stale-edit';
import { CONDITION_LABELS } from '$lib/model/team/datasets/condition-words';
import { CONDITION_NAMES, type Conditions } from '$lib/model/team/datasets/conditions';
import { typedConditions, type TypedConditions } from '$lib/model/team/datasets/typed-conditions';

/**
 * Brings what one person typed together with what another saved meanwhile: a field changed here keeps what was typed,
 * a field left alone takes the other's text. Nothing typed is lost, and nothing of the other is undone unseen.
 *
 * @param before TypedConditions as the form was opened with, as JSON; when it cannot be read, all counts as typed
 */
export function mergeStale(
  typed: TypedConditions,
  before: string,
  current: Conditions
): { typed: TypedConditions; others: OthersChange[] } {
  const opened = readBefore(before);
  const now = typedConditions(current);
  const merged = { ...typed };
  const others: OthersChange[] = [];
  // Browsers send line ends of two signs.
  const same = (a: string, b: string) =>
    a.replace(/\r\n?/g, '\n').trim() === b.replace(/\r\n?/g, '\n').trim();
  for (const name of CONDITION_NAMES) {
    const from = opened?.[name] ?? '';
    const leftAlone = opened !== null && same(typed[name], from);
    if (leftAlone) merged[name] = now[name];
    if (!same(now[name], opened ? from : typed[name])) {
      const both = !leftAlone && !same(typed[name], now[name]);
      others.push({ name, label: CONDITION_LABELS[name], from, to: now[name], both });
    }
  }
  return { typed: merged, others };
}

function readBefore(before: string): Partial<TypedConditions> | null {
  try {
    const read: unknown = JSON.parse(before);
    if (typeof read !== 'object' || read === null) return null;
    const entries = Object.entries(read).filter(([, text]) => typeof text === 'string');
    return Object.fromEntries(entries) as Partial<TypedConditions>;
  } catch {
    return null;
  }
}
