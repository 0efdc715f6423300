import { dataset } from '$lib/server/db/schema';
import { bulkEdit } from '$lib/server/services/datasets/bulk-edit';
import { datasetById } from '$lib/server/services/datasets/dataset-by-id';
import { misfits } from '$lib/server/services/datasets/misfits';
import { uploadJson } from '$lib/server/services/datasets/upload-json';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { bareConditions, type Conditions } from '$lib/model/team/datasets/conditions';
import { readSettings } from '$lib/page/read-settings';
import { settingsWith } from '$lib/page/settings-with';
import { freshSettings } from '$lib/page/settings';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { BadInput, type CountData } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { archiveOf, makeTrueDataset, tampered, textsOf } from '../../../../support/archives';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { setting } from './support';

const histogram: CountData = {
  kind: 'histogram',
  counts: [
    [0, 40],
    [1, 30],
    [2, 9]
  ],
  lump: null
};
const lumped: CountData = { ...histogram, lump: { from: 3, shots: 4 } };
const stated = (more: Partial<Conditions>): Conditions => ({ ...bareConditions('a'), trials: 12, ...more });

/** What the engine itself says of the same counts and options. */
async function engineSays(data: CountData, conditions: Conditions): Promise<string> {
  const settings = { ...freshSettings(), resamples: '19', trials: String(conditions.trials ?? 'unknown') };
  const { geometry, misread } = conditions;
  const typed = settingsWith({ ...settings, kept: conditions.kept ?? '' }, { geometry, misread });
  const read = await readSettings(typed);
  if (!read.ok) throw new Error(JSON.stringify(read.problems));
  return diagnose(data, read.options).then(
    () => 'no refusal',
    (error: unknown) => (error instanceof BadInput ? error.reason : String(error))
  );
}

describe('a cut and the uncertainty of a misread rate', () => {
  it.each([
    ['leaves nothing', histogram, stated({ kept: '4-2' })],
    ['leaves one count', histogram, stated({ kept: '1-1' })],
    ['is passed by the counts', histogram, stated({ kept: '0-1' })],
    ['stands beside a lump', lumped, stated({ kept: '0-9' })],
    ['has no number of trials', histogram, stated({ kept: '0-9', trials: null })],
    ['has too many trials', histogram, stated({ kept: '0-9', trials: 100_000 })],
    [
      'stands beside a misread rate',
      histogram,
      stated({ kept: '0-9', geometry: 'open-bonds', misread: 0.001 })
    ]
  ])('a cut that %s is refused in the words of the diagnosis', async (_, data, conditions) => {
    const { kept } = misfits(conditions, data);
    expect(kept).toBe(await engineSays(data, conditions));
    expect(kept).toMatch(/\.$/);
  });

  it('go together with counts that fit', () => {
    expect(misfits(stated({ kept: '0-2', misread: 0.01, misreadUncertainty: 0.002 }), histogram)).toEqual({});
    expect(misfits(stated({ misreadUncertainty: 0.002 }), histogram)).toEqual({
      misreadUncertainty: 'Write the chance to misread a site as well, or leave this empty.'
    });
    // A count that no array holds is refused by the trials before laws are looked at.
    const far: CountData = { kind: 'histogram', counts: [[9e15, 1]], lump: null };
    expect(misfits(stated({ kept: '0-', trials: null }), far).kept).toMatch(/number of trials is known/);
  });

  it('are stated by a script, within JSON or inside a body of the reader’s own keys', () => {
    const { db, experimenter } = setting();
    const send = (body: object) => uploadJson(db, experimenter, Buffer.from(JSON.stringify(body)));
    const conditions = { trials: 12, misread: 0.01, misreadUncertainty: 0.002, kept: '0–2' };
    const sent = send({ name: 'one', counts: { 0: 4, 1: 3 }, conditions });
    if (!sent.ok) throw new Error(JSON.stringify(sent));
    expect(datasetById(db, experimenter, sent.id)).toMatchObject({
      dataset: { conditions: { ...conditions, kept: '0-2' } }
    });
    expect(send({ name: 'two', counts: { 0: 4, 1: 4 }, conditions: { kept: 'low' } })).toMatchObject({
      reason: 'bad-fields',
      fields: [{ at: 'conditions.kept', message: expect.stringContaining('such as 0-4') }]
    });
    expect(
      send({ name: 'two', counts: { 0: 4, 9: 4 }, conditions: { trials: 12, kept: '0-4' } })
    ).toMatchObject({
      reason: 'bad-conditions',
      problems: { kept: expect.stringContaining('A count of 9 was seen') }
    });
    expect(send({ name: 'two', counts: { 0: 4 }, conditions: { misread: 0.5 } })).toMatchObject({
      reason: 'bad-fields'
    });
    db.$client.close();
  });

  it('are set on many at once only where they fit all', () => {
    const { db, lead } = setting();
    const ids = [histogram, lumped].map((data) => makeTrueDataset(db, lead, data, { trials: 12 }));
    expect(bulkEdit(db, lead, { datasets: ids, set: { kept: '0-9' } })).toMatchObject({
      reason: 'bad-conditions',
      troubles: [{ id: ids[1], problems: { kept: expect.stringContaining('cannot both') } }]
    });
    expect(bulkEdit(db, lead, { datasets: [ids[0]], set: { kept: '0-9' } })).toEqual({
      ok: true,
      changed: 1
    });
    // The number of trials may then no longer be taken away.
    expect(bulkEdit(db, lead, { datasets: [ids[0]], set: { trials: null } })).toMatchObject({ ok: false });
    db.$client.close();
  });

  it('go through an archive; one made before they existed states neither', async () => {
    const { db, lead } = setting();
    makeTrueDataset(db, lead, histogram, {
      trials: 12,
      misread: 0.01,
      misreadUncertainty: 0.002,
      kept: '0-9'
    });
    const archive = await archiveOf(db, lead);
    const other = freshDatabase();
    const newLead = makeMember(other, makeTeam(other).id, 'lead');
    expect(importArchive(other, newLead, archive)).toMatchObject({ ok: true, datasets: 1 });
    const [row] = other.select().from(dataset).all();
    expect(row).toMatchObject({ misread: 0.01, misreadUncertainty: 0.002, kept: '0-9' });
    const path = 'datasets/00001.json';
    expect(textsOf(await archiveOf(other, newLead))[path]).toBe(textsOf(archive)[path]);

    const file = JSON.parse(textsOf(archive)[path]) as { conditions: Partial<Conditions> };
    delete file.conditions.kept;
    delete file.conditions.misreadUncertainty;
    const old = tampered(archive, { [path]: JSON.stringify(file) });
    const third = freshDatabase();
    const thirdLead = makeMember(third, makeTeam(third).id, 'lead');
    expect(importArchive(third, thirdLead, old)).toMatchObject({ ok: true, datasets: 1 });
    expect(third.select().from(dataset).all()).toMatchObject([{ misreadUncertainty: null, kept: null }]);
    for (const one of [db, other, third]) one.$client.close();
  });

  it('a report made with them goes through an archive too', async () => {
    const { saveReport } = await import('$lib/server/services/reports/save-report');
    const { report } = await import('$lib/server/db/schema');
    const { db, lead } = setting();
    const datasetId = makeTrueDataset(db, lead, histogram, { trials: 12, kept: '0-9' });
    const options = {
      ...defaultOptions,
      ...{ trials: 12, resamples: 19, misread: 0.01, misreadUncertainty: 0.002, kept: { from: 0, to: 9 } }
    };
    const document = await diagnose(histogram, options);
    const place = { teamId: lead.teamId, datasetId, createdBy: null };
    db.transaction((tx) => saveReport(tx, { ...place, document, options }));
    const other = freshDatabase();
    const newLead = makeMember(other, makeTeam(other).id, 'lead');
    expect(importArchive(other, newLead, await archiveOf(db, lead))).toMatchObject({ ok: true, reports: 1 });
    expect(JSON.parse(other.select().from(report).all()[0].options)).toEqual(options);
    for (const one of [db, other]) one.$client.close();
  });
});
