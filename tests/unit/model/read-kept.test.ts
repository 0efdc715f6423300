import { parseOptions } from '../../../src/cli/diagnose/parse-options';
import { recomputeCommand } from '$lib/model/exports/recompute-command';
import { readKept, writeKept } from '$lib/model/read-kept';
import { writeAddress } from '$lib/page/address';
import { readAddress } from '$lib/page/read-address';
import { readSettings } from '$lib/page/read-settings';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { describe, expect, it } from 'vitest';

describe('counts kept, as typed', () => {
  it.each([
    ['0-4', { from: 0, to: 4 }],
    [' 1 – 12 ', { from: 1, to: 12 }],
    ['1-', { from: 1, to: null }]
  ])('%s', (typed, kept) => {
    expect(readKept(typed)).toEqual(kept);
    expect(readKept(writeKept(kept))).toEqual(kept);
  });
  it.each(['', '-4', '4', 'a-b', '1-2-3', '0.5-4'])('refuses “%s”', (typed) => {
    expect(readKept(typed)).toBeNull();
  });

  it('goes through address, fields, command line and the command that computes again', async () => {
    const data = {
      kind: 'histogram' as const,
      counts: [
        [1, 40],
        [2, 31],
        [3, 9]
      ] as [number, number][],
      lump: null
    };
    const options = { ...defaultOptions, trials: 20, kept: { from: 1, to: 4 } };
    const address = writeAddress(data, options, null)!;
    expect(address).toContain('kept=1-4');
    const read = readAddress(address);
    if (!read.ok) throw new Error(read.problem);
    const settings = await readSettings(read.address.settings);
    expect(settings).toMatchObject({ ok: true, options: { kept: { from: 1, to: 4 } } });
    expect(await readSettings({ ...read.address.settings, kept: 'all' })).toMatchObject({
      ok: false,
      problems: { kept: expect.stringMatching(/0-4/) as string }
    });
    expect(parseOptions(['x.csv', '--kept', '1-4'])).toMatchObject({
      diagnose: { kept: { from: 1, to: 4 } }
    });
    expect(() => parseOptions(['x.csv', '--kept', 'none'])).toThrow();
    const document = await diagnose(data, { ...options, resamples: 19 });
    expect(recomputeCommand(document, { counts: 'c.csv', format: 'counts', supplied: null })).toContain(
      '--kept 1-4'
    );
  });
});
