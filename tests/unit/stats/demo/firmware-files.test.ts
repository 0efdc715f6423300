import { readdirSync, readFileSync } from 'node:fs';
import { readCsv } from './read-firmware';
import { FIRMWARE_GROUPS, FIRMWARE_VERSIONS, firmwareFiles } from '$lib/stats/demo/firmware-files';
import { gateReport } from '$lib/stats/versions/gate-report';
import type { VersionCell } from '$lib/stats/versions/types';
import { describe, expect, it } from 'vitest';

const files = firmwareFiles();
const cells = files.map(({ name, text }): VersionCell => {
  const [version, group] = [name.slice(0, 7), name.slice(8, 10)];
  const histogram = { kind: 'histogram' as const, counts: readCsv(text), lump: null };
  return { version, group, label: name, histogram, trials: 16, unit: 'defect', geometry: 'sites' };
});

describe('the invented firmware versions', () => {
  it('are what the generator writes, all and no others', () => {
    const there = readdirSync('fixtures/firmware').filter((name) => name.endsWith('.csv'));
    expect(there.sort()).toEqual(files.map(({ name }) => name).sort());
    for (const { name, text } of files)
      expect(readFileSync(`fixtures/firmware/${name}`, 'utf8') === text, name).toBe(true);
    expect(files).toHaveLength(FIRMWARE_VERSIONS.length * FIRMWARE_GROUPS.length);
  });

  it('fail their gate where crosstalk was added, in those groups, and nowhere else', () => {
    const rule = { reference: 'ebb-3.1', tolerance: 0.1, alpha: 0.05, groups: null };
    const stands = FIRMWARE_VERSIONS.map((version) => {
      const { groups, outcome } = gateReport(rule, version, cells);
      return [outcome, groups.filter((one) => one.outcome === 'failed').map(({ group }) => group)];
    });
    expect(stands).toEqual([
      ['passed', []],
      ['passed', []],
      ['failed', ['q2', 'q5']],
      ['passed', []]
    ]);
  });
});
