import { and, eq, isNotNull, isNull, min } from 'drizzle-orm';
import type { DeviceTimeline, TimelineMark } from '../../../model/team/devices/timeline';
import { divergenceLimit, type KnownDivergence } from '../../../stats/versions/divergence-limit';
import { seesRise } from '../../../stats/versions/sees-rise';
import type { CellReport, VersionsReport } from '../../../stats/versions/types';
import type { Database } from '../../db/client';
import { dataset, gateRule } from '../../db/schema';
import type { Actor } from '../access/actor';
import { cellFacts } from '../gates/gate-cells';
import { cellsOf } from './cells-of';
import { divergencesOf } from './divergences-of';
import { findDevice, type DeviceRow } from './find-device';
import { timelineReport } from './timeline-report';
import { versionsOf } from './versions-of';

export interface TimelineAsked {
  /** Id of the version that the others are held against; null for that of the gate's rule, else the first. */
  reference: string | null;
  /** Name of the group that is drawn; null for the one that rose most clearly, else the first. */
  group: string | null;
}

export type ReadTimeline = { ok: true; timeline: DeviceTimeline } | { ok: false; reason: 'unknown' };

/** Level and excess that matters where the device has no rule of its own. Common practice. */
const UNRULED = { alpha: 0.05, tolerance: 0.1 };

const byName = new Intl.Collator('en', { numeric: true });

/** The versions of a device over time: how mean and scatter of each group stand to a reference version. */
export async function deviceTimeline(
  db: Database,
  actor: Actor,
  id: string,
  asked: TimelineAsked
): Promise<ReadTimeline> {
  const found = findDevice(db, actor, id, 'see');
  if (!found) return { ok: false, reason: 'unknown' };
  const cells = cellsOf(db, found);
  const measured = new Set(cells.map(({ firmware }) => firmware));
  const all = versionsOf(db, found);
  const versions = all.filter(({ name }) => measured.has(name)).map(({ id, name }) => ({ id, name }));
  const rule = db.select().from(gateRule).where(eq(gateRule.deviceId, id)).get();
  const wanted = asked.reference ?? rule?.referenceId ?? null;
  const reference = versions.find((version) => version.id === wanted) ?? versions.at(0) ?? null;
  const gone =
    asked.reference !== null && reference?.id !== asked.reference
      ? (all.find((version) => version.id === asked.reference)?.name ?? 'that was asked for')
      : asked.reference === null && rule && reference?.id !== rule.referenceId
        ? rule.referenceName
        : null;
  const { alpha, tolerance } = rule ?? UNRULED;
  const facts = cellFacts(db, cells).toSorted((a, b) => byName.compare(a.group, b.group));
  const report = await timelineReport(db, facts, {
    versions: versions.map(({ name }) => name),
    reference: reference?.name ?? null,
    alpha,
    tolerance,
    pairs: null
  });
  const group = report.groups.includes(asked.group ?? '') ? asked.group : clearest(report);
  const reports = new Map(cells.map((cell) => [cell.dataset.id, cell.report?.id]));
  const drawn = facts.filter((fact) => fact.group === group);
  const reportIds = new Map(drawn.map((fact) => [fact.version, reports.get(fact.id)]));
  const divergences = divergencesOf(
    db,
    [...reportIds.values()].filter((one) => one !== undefined)
  );
  const known = (cell: CellReport | undefined): KnownDivergence | null => {
    const found = cell && divergences.get(reportIds.get(cell.version) ?? '')?.known;
    return found ? { ...found, shots: cell.shots } : null;
  };
  const inGroup = report.cells.filter((cell) => cell.group === group);
  const theirs = known(inGroup.find((cell) => cell.version === report.reference));
  const points = inGroup.map(({ group: _group, smallestRise: _smallest, ...cell }) => {
    const own = known({ ...cell, group: _group, smallestRise: _smallest });
    return {
      ...cell,
      divergence: divergences.get(reportIds.get(cell.version) ?? '')?.told ?? null,
      // Limits are there where the two are alike; those of the reference itself are not drawn.
      divergenceLimit: cell.limits && own && theirs ? divergenceLimit(theirs, own) : null
    };
  });
  const { groups, statement, because, cautions } = report;
  return {
    ok: true,
    timeline: {
      versions,
      reference: report.reference,
      goneReference: gone,
      goneGroup: asked.group !== null && group !== asked.group,
      groups,
      group,
      alpha,
      tolerance,
      points,
      marks: marksOf(report),
      outOfOrder: outOfOrder(db, found, versions),
      statement,
      because,
      cautions
    }
  };
}

/** The group with the clearest rise over the reference; the first where none is told. */
function clearest({ cells, groups }: VersionsReport): string | null {
  const least = cells.reduce<CellReport | null>(
    (best, cell) => (cell.rise && cell.rise.p < (best?.rise?.p ?? 2) ? cell : best),
    null
  );
  return least?.group ?? groups.at(0) ?? null;
}

function marksOf({ cells, groups, versions, tolerance }: VersionsReport): (TimelineMark | null)[][] {
  const [down, across] = [groups, versions].map((names) => new Map(names.map((name, i) => [name, i])));
  const marks = groups.map(() => versions.map((): TimelineMark | null => null));
  for (const cell of cells) {
    const { group, version, mark, rise, hindrances } = cell;
    marks[down.get(group)!][across.get(version)!] = {
      mark,
      factor: rise?.factor ?? null,
      pAdjusted: rise?.pAdjusted ?? null,
      hindrance: hindrances.at(0) ?? null,
      seesRise: seesRise(cell, tolerance)
    };
  }
  return marks;
}

/** The first two neighbours of the order whose first datasets came the other way round. */
function outOfOrder(
  db: Database,
  { teamId, name }: DeviceRow,
  versions: { name: string }[]
): DeviceTimeline['outOfOrder'] {
  const rows = db
    .select({ firmware: dataset.firmware, first: min(dataset.createdAt) })
    .from(dataset)
    .where(
      and(
        eq(dataset.teamId, teamId),
        isNull(dataset.deletedAt),
        eq(dataset.device, name),
        isNotNull(dataset.firmware)
      )
    )
    .groupBy(dataset.firmware)
    .all();
  const first = new Map(rows.map((row) => [row.firmware, row.first ?? 0]));
  const i = versions.findIndex(
    (version, at) => at > 0 && first.get(version.name)! < first.get(versions[at - 1].name)!
  );
  return i < 0 ? null : { earlier: versions[i].name, later: versions[i - 1].name };
}
