import { documentText } from '$lib/model/document-text';
import { shownByLink, type SharedThing } from '$lib/model/link/shown-by-link';
import { diagnosisSchema } from '$lib/model/diagnosis-schema';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { diagnoseNine, nineCounts, SECRETS } from '../../../support/links';

let thing: SharedThing;

beforeAll(async () => {
  const { document, options } = await diagnoseNine();
  thing = {
    team: { name: SECRETS.team },
    madeBy: 'Ibexia',
    number: 2,
    madeAt: Date.UTC(2031, 1, 4),
    engineVersion: document.engine.version,
    document: documentText(document),
    sha256: 'f'.repeat(64),
    options,
    counts: nineCounts,
    conditions: {
      name: SECRETS.dataset,
      device: SECRETS.device,
      firmware: SECRETS.firmware,
      group: SECRETS.group,
      quenchTime: 4,
      quenchUnit: SECRETS.quenchUnit,
      holdTime: 2.5,
      holdUnit: 'µs',
      geometry: 'sites',
      unit: 'defect',
      trials: 24,
      trialsWhy: SECRETS.trialsWhy,
      misread: null,
      misreadUncertainty: null,
      kept: null,
      postSelection: SECRETS.postSelection,
      measuredOn: '2031-02-03',
      notes: SECRETS.notes
    }
  };
});

const NAMES = /quagga|okapi|zebu|wombat|ibex|numbat|gnus|2031/i;
/** What each choice of a link shows: names, counts, remarks. */
const TABLE = (['report', 'report-and-counts'] as const).flatMap((shows) =>
  [false, true].flatMap((blind) => [false, true].map((allowsRemarks) => ({ shows, blind, allowsRemarks })))
);

describe('what is shown by a link', () => {
  it.each(TABLE)('$shows, blind $blind, remarks $allowsRemarks', (link) => {
    const view = shownByLink(link, thing);
    const text = JSON.stringify(view);
    expect(NAMES.test(text)).toBe(!link.blind);
    expect(view.origin === null).toBe(link.blind);
    expect(view.remarks).toBe(link.allowsRemarks);
    expect(view.content.kind).toBe(link.shows === 'report' ? 'without-counts' : 'whole');
    expect(view.times).toMatchObject({ quenchTime: 4, holdTime: 2.5, holdUnit: 'µs' });
    expect(view.times.quenchUnit).toBe(link.blind ? null : 'gnus');
    expect(view.fileName).toBe(link.blind ? 'severalty-report' : 'severalty-wombat-run-report-2');
  });

  it('names, when it is not blind, everything that it hides when it is', () => {
    const open = JSON.stringify(shownByLink({ shows: 'report', blind: false, allowsRemarks: false }, thing));
    for (const [key, secret] of Object.entries(SECRETS)) if (key !== 'slug') expect(open).toContain(secret);
  });

  it('gives the stored bytes with the counts', () => {
    const view = shownByLink({ shows: 'report-and-counts', blind: true, allowsRemarks: false }, thing);
    expect(view.content).toMatchObject({
      document: thing.document,
      counts: nineCounts,
      options: thing.options
    });
  });

  it('renames batches of a blind link, and the document stays the same', async () => {
    const shots = Array.from({ length: 240 }, (_, i) => (i * 7919) % 5);
    const named: CountData = {
      kind: 'shots',
      shots,
      batches: shots.map((_, i) => ['Okapitron b', 'Okapitron a', 'zebu'][Math.floor(i / 80)])
    };
    const view = shownByLink(
      { shows: 'report-and-counts', blind: true, allowsRemarks: false },
      { ...thing, counts: named }
    );
    if (view.content.kind !== 'whole') throw new Error('no counts');
    expect(JSON.stringify(view)).not.toMatch(NAMES);
    const options = { ...defaultOptions, trials: 6, resamples: 99 };
    const [theirs, ours] = [await diagnose(named, options), await diagnose(view.content.counts, options)];
    expect(documentText(ours)).toBe(documentText(theirs));
  });
});

describe('a report without its counts', () => {
  const hidden = () => {
    const view = shownByLink({ shows: 'report', blind: true, allowsRemarks: false }, thing);
    if (view.content.kind === 'whole') throw new Error('with counts');
    return view.content.summary;
  };

  it('has no number of shots in it, and no digest of the counts', () => {
    const rest = { ...hidden(), engine: null };
    const text = JSON.stringify(rest);
    const document = diagnosisSchema.parse(JSON.parse(thing.document));
    for (const [count, shots] of document.data.counts.filter(([, h]) => h > 24)) {
      expect(text.match(new RegExp(`(?<![\\d.])${shots}(?!\\d)`)), `${count}: ${shots}`).toBeNull();
    }
    expect(text).not.toContain(document.data.digest.slice(7));
  });

  it('keeps the answer and the tests by their p', () => {
    const summary = hidden();
    const document = diagnosisSchema.parse(JSON.parse(thing.document));
    expect(summary.answer.statement).toBe(document.answer.statement);
    // 99 resamples: p are hundredths, and two digits keep them.
    expect(summary.tests.map(({ p }) => p)).toEqual(document.tests.map(({ p }) => p));
    expect(summary.moments.mean.value).toBeCloseTo(document.moments.mean.value!, 2);
  });
});
