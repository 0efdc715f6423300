import { describe, expect, it } from 'vitest';
import { readCounts } from '$lib/formats/read-counts';
import { datasets, histogram, problems, shotList } from './support';

describe('JSON', () => {
  it.each([
    '{"counts": {"0": 12, "1": 30}}',
    '{"counts": [[0, 12], [1, 30]]}',
    '[[0, 12], [1, 30]]',
    '{"1": 30, "0": 12}',
    '[["0", 12], ["1", 30.0]]',
    '\ufeff \r\n{"counts": {"0": "12", "1": 3e1}, "shots": 42}'
  ])('histogram %s', (text) => {
    expect(histogram(text)).toEqual({
      kind: 'histogram',
      counts: [
        [0, 12],
        [1, 30]
      ],
      lump: null
    });
  });

  it('reads a lump as a key or as the diagnosis document writes it', () => {
    const lump = { from: 10, shots: 18 };
    expect(histogram('{"counts": {"0": 1, "10+": 18}}').lump).toEqual(lump);
    expect(histogram('{"counts": [[0, 1]], "lump": {"from": 10, "shots": 18}}').lump).toEqual(lump);
  });

  it('reads shots and batches', () => {
    expect(shotList('{"shots": [3, 0, 4]}')).toEqual({ shots: [3, 0, 4], batches: null });
    expect(shotList('{"shots": [3, 0, 4], "batches": ["a", "a", 2]}').batches).toEqual(['a', 'a', '2']);
  });

  it('hands on what the file states about the experiment', () => {
    const [set] = datasets(
      '{"name": "Kelp", "trials": 12, "unit": "pair", "geometry": "ring-bonds", "misread": 0.01, "misreadUncertainty": 0.002, "conditions": {"tau": 5}, "counts": {"2": 3}}'
    );
    expect(set).toMatchObject({
      name: 'Kelp',
      conditions: { tau: '5' },
      suggested: {
        trials: 12,
        unit: 'pair',
        geometry: 'ring-bonds',
        misread: 0.01,
        misreadUncertainty: 0.002
      }
    });
    expect(datasets('{"trials": null, "counts": {"2": 3}}')[0].suggested).toEqual({ trials: null });
  });

  it('hands on counts kept, as a document or a person writes them, and refuses what is no cut', () => {
    const kept = (text: string) => datasets(`{"kept": ${text}, "counts": {"2": 3}}`)[0].suggested.kept;
    expect(kept('{"from": 1, "to": null}')).toEqual({ from: 1, to: null });
    expect(kept('{"from": 0, "to": 4}')).toEqual({ from: 0, to: 4 });
    expect(kept('"0-4"')).toEqual({ from: 0, to: 4 });
    expect(kept('null')).toBeUndefined();
    for (const wrong of ['"few"', '7', '{"from": -1}', '{"from": 0, "to": "4"}', '{}'])
      expect(problems(`{"kept": ${wrong}, "counts": {"2": 3}}`)[0], wrong).toContain('The counts kept are ');
  });

  it('reads the data of a diagnosis document again', () => {
    const document = {
      format: 'severalty.diagnosis/1',
      engine: {},
      data: {
        digest: 'sha256:0',
        shots: 42,
        trials: 12,
        unit: 'defect',
        geometry: 'sites',
        misread: null,
        counts: [
          [0, 12],
          [1, 30]
        ],
        lump: null
      }
    };
    const [set] = datasets(JSON.stringify(document));
    expect(set.data).toEqual({
      kind: 'histogram',
      counts: [
        [0, 12],
        [1, 30]
      ],
      lump: null
    });
    expect(set.suggested).toEqual({ trials: 12, unit: 'defect', geometry: 'sites', misread: null });
  });

  it('a plain list is read only when told which', () => {
    expect(problems('[3, 0, 4]')[0]).toContain('1:1 A plain list of numbers can be read two ways');
    expect(shotList('[3, 0, 4]', { format: 'shots' }).shots).toEqual([3, 0, 4]);
    expect(histogram('{"counts": [3, 0, 4]}', { format: 'positions' }).counts).toEqual([
      [0, 3],
      [1, 0],
      [2, 4]
    ]);
  });

  it('says which keys are not used', () => {
    const result = readCounts('{"counts": {"0": 1}, "operator": "x"}');
    expect(result.ok && result.notes).toEqual(['Not used: operator.']);
  });

  it('is not harmed by keys such as __proto__', () => {
    expect(problems('{"counts": {"0": 1, "__proto__": 2}}')).toEqual(['1:21 "__proto__" is not a number.']);
    expect(datasets('{"counts": {"0": 1}, "__proto__": {"trials": 9}}')[0].suggested).toEqual({});
    expect(({} as Record<string, unknown>).trials).toBeUndefined();
  });
});

describe('JSON is refused', () => {
  it.each([
    [
      '{"counts": {"0": 12, "1": 3, "0": 4}}',
      {},
      '1:30 The count 0 is given twice: here and on line 1, column 13.'
    ],
    ['{"counts": {"0": 12,\n "00": 4}}', {}, '2:2 The count 0 is given twice: here and on line 1.'],
    ['{"counts": {"0": -1}}', {}, '1:18 "-1" is negative.'],
    ['{"counts": {"0": 1.5}}', {}, '1:18 "1.5" is not a whole number.'],
    ['{"counts": {"0": NaN}}', {}, '1:18 "NaN" is no number.'],
    ['{"counts": {"0": -Infinity}}', {}, '1:18 "-Infinity" is infinite.'],
    ['{"counts": {"0": null}}', {}, '1:18 Here stands null, not a number.'],
    ['{"counts": {"0": 9007199254740993}}', {}, '1:18 "9007199254740993" is above 2^53'],
    ['[[0, 1], [1, 2, 3]]', {}, '1:10 Here stands a list of 3, not a pair.'],
    ['[[0, 0]]', {}, '1:null There are no shots'],
    ['{"counts": {}}', {}, '1:null There are no shots'],
    ['[]', {}, '1:null There are no shots'],
    ['{"shots": []}', {}, '1:11 There are no shots.'],
    ['{"shots": [1, 2], "batches": ["a"]}', {}, '1:30 "batches" is a list of 1.'],
    ['{"counts": {"5": 1}, "trials": 4}', {}, '1:13 The count 5 is above the 4 trials stated in the file.'],
    ['{"counts": {"5": 1}, "trials": 9}', { trials: 4 }, '1:13 The count 5 is above the 4 trials given.'],
    ['{"counts": {"5": 1}, "trials": 0.5}', {}, '1:32 "0.5" is not a whole number.'],
    ['{"counts": {"5": 1}, "unit": "pairs"}', {}, '1:30 This must be one of defect, pair.'],
    ['{"counts": {"5": 1}, "shots": 2}', {}, '1:31 "shots" says 2, but the counts add up to 1.'],
    ['{"counts": {"5": 1}, "counts": {"6": 1}}', {}, '1:22 The key "counts" is given twice.'],
    ['{"histogram": 3}', {}, '1:1 There is neither "counts" nor a list "shots"'],
    ['[{"count": 0, "shots": 1}]', {}, '1:1 A list of objects is not read.'],
    ['{"counts": {"0": 12', {}, '1:20 The text ends']
  ])('%s %j', (text, options, expected) => {
    const found = problems(text, options);
    expect(found[0]).toContain(expected);
    expect(found.length).toBe(1);
  });

  it('lets the person overrule the trials of the file', () => {
    expect(histogram('{"counts": {"5": 1}, "trials": 4}', { trials: null }).counts).toEqual([[5, 1]]);
  });
});
