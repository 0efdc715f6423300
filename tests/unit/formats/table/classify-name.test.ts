import { describe, expect, it } from 'vitest';
import { classifyName } from '$lib/formats/table/classify-name';
import { normaliseName } from '$lib/formats/table/normalise-name';

describe('classifyName', () => {
  it.each([
    [
      'frequency',
      'Frequency, shots, number of shots, n_shots, Occurrences, Häufigkeit, HAEUFIGKEIT, effectif, Fréquence, frecuencia, Anzahl Schüsse, h, частота, 頻度, 出現回数, 频数, 빈도, throws'
    ],
    [
      'count',
      'defects, Number of kinks, kinkCount, Defekte, Anzahl Fehler, défauts, defectos, counts per shot, accidents, 欠陥数'
    ],
    ['symbol', 'n, k, x, value, Wert'],
    ['either', 'count, Counts, number, Anzahl, nombre, número, aantal'],
    ['shot', 'shot, Shot number, shot_id, index, Schuss, tir'],
    ['batch', 'batch, Batch ID, session, série'],
    ['run', 'run, Run number'],
    [
      'condition',
      'device, firmware, Firmware version, qubit_group, Register, quench time (µs), quenchTime, hold_time, Gerät, Temperatur'
    ],
    ['trials', 'trials, number of sites'],
    ['share', 'relative frequency, probability, p, expected, percent, cumulative frequency'],
    ['remark', 'comment, Notes, Bemerkung'],
    ['unknown', 'foo, women, squares']
  ])('knows %s', (expected, names) => {
    const found = names.split(', ').map((name) => [name, classifyName(name)]);
    expect(found).toEqual(names.split(', ').map((name) => [name, expected]));
  });
});

it('normaliseName drops accents, units and marks', () => {
  expect(normaliseName('  Quench_Time (µs) ')).toBe('quench time');
  expect(normaliseName('quenchTime')).toBe('quench time');
  expect(normaliseName('Größe')).toBe('grosse');
  expect(normaliseName('결함')).toBe('결함');
});
