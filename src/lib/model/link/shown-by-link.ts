import type { FrozenConditions } from '$lib/model/team/frozen-conditions';
import type { CountData, DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import type { Shows } from './link-options';
import { olderDocument } from '../older-document';
import { namelessBatches } from './nameless-batches';
import { neutralUnit } from './neutral-unit';
import { plainName } from './plain-name';
import { withoutCounts, type Summary } from './summary';

/** All there is about a report, before a link decides what of it is shown. */
export interface SharedThing {
  team: { name: string };
  /** Who made the report; null for the program, and for people who are gone. */
  madeBy: string | null;
  number: number;
  madeAt: number;
  engineVersion: string;
  /** Document as stored, byte for byte, and the sha256 of it. */
  document: string;
  sha256: string;
  options: DiagnoseOptions;
  conditions: FrozenConditions;
  counts: CountData;
}

/** Whose report it is. */
export interface Origin {
  team: string;
  madeBy: string | null;
  madeAt: number;
  number: number;
  dataset: string;
  device: string | null;
  firmware: string | null;
  group: string | null;
  measuredOn: string | null;
  trialsWhy: string | null;
  postSelection: string | null;
  notes: string | null;
}

/** Times of the experiment, which name nobody. */
export interface Times {
  quenchTime: number | null;
  quenchUnit: string | null;
  holdTime: number | null;
  holdUnit: string | null;
}

export type SharedContent =
  | { kind: 'whole'; document: string; sha256: string; options: DiagnoseOptions; counts: CountData }
  | { kind: 'without-counts'; summary: Summary };

/** What the page of a link gets, and nothing else: it stands in the page's source. */
export interface LinkView {
  /** Null when the link is blind. */
  origin: Origin | null;
  times: Times;
  engineVersion: string;
  /** Name for files that are saved, without an ending. */
  fileName: string;
  remarks: boolean;
  content: SharedContent;
}

/**
 * What is shown to whom through a link: the one place that decides.
 *
 * Blind hides team, people, device, firmware and group, and with them whatever people typed freely and the days, since either
 * can give them away: the dataset's name, notes, reasons, post-selection, units that are no units of time, names of
 * batches. `report` alone keeps the counts back: see withoutCounts.
 */
export function shownByLink(
  link: { shows: Shows; blind: boolean; allowsRemarks: boolean },
  thing: SharedThing
): LinkView {
  const { conditions } = thing;
  const { quenchTime, holdTime } = conditions;
  return {
    origin: link.blind
      ? null
      : {
          team: thing.team.name,
          madeBy: thing.madeBy,
          madeAt: thing.madeAt,
          number: thing.number,
          dataset: conditions.name,
          device: conditions.device,
          firmware: conditions.firmware,
          group: conditions.group,
          measuredOn: conditions.measuredOn,
          trialsWhy: conditions.trialsWhy,
          postSelection: conditions.postSelection,
          notes: conditions.notes
        },
    times: {
      quenchTime,
      quenchUnit: link.blind ? neutralUnit(conditions.quenchUnit) : conditions.quenchUnit,
      holdTime,
      holdUnit: link.blind ? neutralUnit(conditions.holdUnit) : conditions.holdUnit
    },
    engineVersion: thing.engineVersion,
    fileName: link.blind
      ? 'severalty-report'
      : `severalty-${plainName(conditions.name, 'dataset')}-report-${thing.number}`,
    remarks: link.allowsRemarks,
    content:
      link.shows === 'report-and-counts'
        ? {
            kind: 'whole',
            document: thing.document,
            sha256: thing.sha256,
            options: thing.options,
            counts: link.blind ? namelessBatches(thing.counts) : thing.counts
          }
        : {
            kind: 'without-counts',
            summary: withoutCounts(olderDocument(JSON.parse(thing.document)) as Diagnosis)
          }
  };
}
