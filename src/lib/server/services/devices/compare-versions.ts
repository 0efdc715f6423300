import { eq } from 'drizzle-orm';
import { MOST_COMPARED, type VersionPairs } from '../../../model/team/devices/version-pairs';
import type { Pace } from '../../../stats/resampling/pace';
import { versionsReport } from '../../../stats/versions/versions-report';
import type { Database } from '../../db/client';
import { gateRule } from '../../db/schema';
import type { Actor } from '../access/actor';
import { cellFacts, withCounts } from '../gates/gate-cells';
import { cellsOf } from './cells-of';
import { findDevice } from './find-device';
import { versionsOf } from './versions-of';

/** Of the shuffles: the same versions give the same answer. */
const SEED = 1;

/** Level where the device has no rule of its own. Common practice. */
const UNRULED = 0.05;

/** What is said of a group that an address asks for and the device does not have. */
const NO_GROUP =
  'There is no group of the name that was asked for, or none of its datasets counts: choose another, and two versions or more that were measured in it.';

/** Others of this server get their turn after each pair. */
const pace: Pace = { breathe: () => new Promise((resolve) => setImmediate(resolve)) };

const byName = new Intl.Collator('en', { numeric: true });

/**
 * Every pair of the chosen versions of one group tested for one law, with Holm's rule over the pairs; nothing is kept.
 *
 * @param asked ids of versions, MOST_COMPARED at most, and the name of a group; the first where it is null
 */
export async function compareVersions(
  db: Database,
  actor: Actor,
  id: string,
  asked: { group: string | null; versions: string[] }
): Promise<{ ok: true; pairs: VersionPairs } | { ok: false; reason: 'unknown' }> {
  const found = findDevice(db, actor, id, 'see');
  if (!found) return { ok: false, reason: 'unknown' };
  const facts = cellFacts(db, cellsOf(db, found)).toSorted((a, b) => byName.compare(a.group, b.group));
  const groups = [...new Set(facts.map(({ group }) => group))];
  const noGroup = asked.group !== null && !groups.includes(asked.group);
  const group = noGroup ? (groups.at(0) ?? null) : (asked.group ?? groups.at(0) ?? null);
  const here = facts.filter((fact) => fact.group === group);
  const measured = new Set(here.map(({ version }) => version));
  const versions = versionsOf(db, found)
    .filter(({ name }) => measured.has(name))
    .map(({ id, name }) => ({ id, name, chosen: asked.versions.includes(id) }));
  const chosen = versions.filter((version) => version.chosen).map(({ name }) => name);
  const open: VersionPairs = {
    versions,
    groups,
    group,
    found: null,
    why: noGroup ? NO_GROUP : whyNot(asked.versions, chosen)
  };
  if (open.why !== null || chosen.length === 0 || group === null) return { ok: true, pairs: open };
  const alpha = db.select().from(gateRule).where(eq(gateRule.deviceId, id)).get()?.alpha ?? UNRULED;
  const cells = withCounts(
    db,
    here.filter(({ version }) => chosen.includes(version))
  );
  const pairs = { groups: [group], versions: chosen, seed: SEED };
  const options = { versions: chosen, reference: null, alpha, tolerance: 1, pairs };
  const report = await versionsReport(cells, options, pace);
  const tests = (report.pairs?.tests ?? []).map(({ group: _group, ...test }) => test);
  return {
    ok: true,
    pairs: {
      ...open,
      found: {
        tests,
        alpha,
        resamples: report.pairs?.resamples ?? 0,
        because: report.because,
        cautions: report.cautions
      }
    }
  };
}

function whyNot(asked: string[], chosen: string[]): string | null {
  if (asked.length === 0) return null;
  if (chosen.length < 2)
    return 'Choose two versions or more that were measured in this group: at least one of those asked for was not, or is not here any more.';
  return chosen.length > MOST_COMPARED
    ? `Choose ${MOST_COMPARED} versions at most: every pair of them is tested.`
    : null;
}
