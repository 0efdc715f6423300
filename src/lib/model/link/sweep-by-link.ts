import { sweepWords } from '$lib/stats/sweep/sweep-words';
import type { SweepReport } from '$lib/stats/sweep/types';
import { neutralUnit } from './neutral-unit';
import { plainName } from './plain-name';

/** All there is about a sweep, before a link decides what of it is shown. */
export interface SharedSweep {
  team: string;
  name: string;
  notes: string | null;
  /** Null for people who are gone. */
  madeBy: string | null;
  madeAt: number;
  engineVersion: string;
  /** Document as stored, the sha256 noted when it was made, and whether the two still agree. */
  document: string;
  sha256: string;
  whole: boolean;
  datasets: { name: string; device: string | null; firmware: string | null; group: string | null }[];
}

/** What the page of a link to a sweep gets, and nothing else: it stands in the page's source. */
export interface SweepView {
  /** Whose it is; null when the link is blind. */
  origin: {
    team: string;
    name: string;
    notes: string | null;
    madeBy: string | null;
    madeAt: number;
    sha256: string;
    /** Each once, with what it was measured on. */
    sources: string[];
  } | null;
  engineVersion: string;
  /** Name for files that are saved, without an ending. */
  fileName: string;
  /** The document: byte for byte where the link is not blind. Null when its bytes are damaged. */
  document: string | null;
}

/**
 * What of a sweep is shown through a link: the one place that decides. Blind hides team, people, days, the sweep's name
 * and notes, and of each dataset name, id and digest; times, shots and cumulants stay, in a unit that names nobody.
 */
export function sweepByLink({ blind }: { blind: boolean }, thing: SharedSweep): SweepView {
  const { team, name, notes, madeBy, madeAt, sha256, datasets, engineVersion } = thing;
  const sources = datasets.map(({ device, firmware, group }) =>
    [device, firmware, group].filter((one) => one !== null).join(', ')
  );
  return {
    origin: blind
      ? null
      : {
          ...{ team, name, notes, madeBy, madeAt, sha256 },
          sources: [...new Set(sources)].filter((one) => one !== '')
        },
    engineVersion,
    fileName: blind ? 'severalty-sweep' : `severalty-${plainName(name, 'sweep')}`,
    document: !thing.whole ? null : blind ? nameless(thing.document) : thing.document
  };
}

/** The document without what people typed: its sentences name datasets, so they are written anew from its numbers. */
function nameless(text: string): string {
  const found = JSON.parse(text) as SweepReport;
  const report = {
    ...found,
    timeUnit: neutralUnit(found.timeUnit) ?? '',
    points: found.points.map(({ dataset, ...point }, i) => ({
      ...point,
      label: `dataset ${i + 1}`,
      ...(dataset && { dataset: { ...dataset, id: '', digest: '' } })
    }))
  };
  return `${JSON.stringify({ ...report, ...sweepWords(report) }, null, 2)}\n`;
}
