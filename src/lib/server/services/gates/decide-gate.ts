import type { WaitingDataset } from '../../../model/team/devices/gate';
import { engineVersion } from '../../../stats/engine-version';
import { gateReport } from '../../../stats/versions/gate-report';
import type { GateReport } from '../../../stats/versions/types';
import { and, desc, eq, like, or, sql } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { gateResult } from '../../db/schema';
import { cellsOf } from '../devices/cells-of';
import type { DeviceRow } from '../devices/find-device';
import { recordEvent } from '../events/record-event';
import { cellFacts, withCounts } from './gate-cells';
import { ruleOf } from './rule-of';

export type DecidedGate =
  | { ok: true; report: GateReport; decidedAt: number; waiting: WaitingDataset[] }
  /** `no-counts`: no dataset of the version or its reference is there to judge. */
  | { ok: false; reason: 'no-rule' | 'no-counts' };

const EVENTS = { passed: 'gate.pass', failed: 'gate.fail', undecided: 'gate.undecided' } as const;

/**
 * The gate of one version as its datasets stand now. What was decided from the same rule, counts and engine is taken
 * from where it is kept; else it is decided and kept, and where the outcome is another than before, an event tells it.
 *
 * Rows are only added: where inputs come back that were judged before others, their row is added again under the digest
 * with a mark of its own, so that the newest row always is the last decision.
 */
export function decideGate(
  db: Database,
  device: DeviceRow,
  version: { id: string; name: string },
  now = Date.now()
): DecidedGate {
  return db.transaction(
    (tx): DecidedGate => {
      const set = ruleOf(tx, device.id);
      if (!set) return { ok: false, reason: 'no-rule' };
      const reference = set.referenceId === null ? null : set.referenceName;
      const names = [...new Set([version.name, ...(reference === null ? [] : [reference])])];
      const cells = names.flatMap((name) => cellsOf(tx, device, name));
      if (cells.length === 0) return { ok: false, reason: 'no-counts' };
      const facts = cellFacts(tx, cells);
      const { tolerance, alpha, groups } = set;
      const rule = { reference, tolerance, alpha, groups };
      const judged = facts.map(({ id: _id, label: _label, diagnosis, ...rest }) => ({
        ...rest,
        diagnosed: diagnosis !== null
      }));
      const inputs = createHash('sha256')
        .update(JSON.stringify([rule, version.name, engineVersion, judged]))
        .digest('hex');
      const waiting = cells.filter(({ waits }) => waits).map(({ dataset: { id, name } }) => ({ id, name }));
      const newest = desc(gateResult.createdAt);
      const mine = eq(gateResult.versionId, version.id);
      const last = tx
        .select()
        .from(gateResult)
        .where(mine)
        .orderBy(newest, desc(sql`rowid`))
        .limit(1)
        .get();
      const read = (text: string) => JSON.parse(text) as GateReport;
      if (last && last.inputs.split('#')[0] === inputs)
        return { ok: true, report: read(last.document), decidedAt: last.createdAt, waiting };
      const again = or(eq(gateResult.inputs, inputs), like(gateResult.inputs, `${inputs}#%`));
      const before = tx.select().from(gateResult).where(and(mine, again)).limit(1).get();
      const report = before ? read(before.document) : gateReport(rule, version.name, withCounts(tx, facts));
      tx.insert(gateResult)
        .values({
          id: newId(),
          teamId: device.teamId,
          versionId: version.id,
          inputs: before ? `${inputs}#${newId()}` : inputs,
          outcome: report.outcome,
          document: JSON.stringify(report),
          engineVersion,
          createdAt: now
        })
        .run();
      if (last?.outcome !== report.outcome) {
        const detail = { device: device.name, deviceId: device.id, version: version.name };
        const happening = { teamId: device.teamId, thing: version.id, detail };
        recordEvent(tx, { ...happening, action: EVENTS[report.outcome] }, now);
      }
      return { ok: true, report, decidedAt: now, waiting };
    },
    { behavior: 'immediate' }
  );
}
