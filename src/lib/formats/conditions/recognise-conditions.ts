import { bareConditions, LENGTHS, type Conditions } from '../../model/team/datasets/conditions';
import { readKept, writeKept } from '../../model/read-kept';
import { CONDITION_LABELS } from '../../model/team/datasets/condition-words';
import type { Dataset } from '../types';
import { conditionOfName, type Stated } from './condition-of-name';
import { readDay } from './read-day';
import { readTime } from './read-time';
import { readGeometry, readUnit } from './read-word';

/** The conditions that a dataset's columns state. */
export interface Recognised {
  conditions: Conditions;
  /** Which column gave which condition, one sentence each. */
  said: string[];
}

/**
 * Conditions of a dataset as its file states them: by the words of the column names, and by what a JSON text states.
 * What no field fits is kept in the notes, so nothing a file says is lost.
 *
 * @param name what the dataset is called unless a condition says better
 */
export function recogniseConditions(dataset: Dataset, name = dataset.name): Recognised {
  const conditions = bareConditions(name.trim().slice(0, LENGTHS.name) || 'counts');
  const said: string[] = [];
  const notes: string[] = [];
  const taken = new Set<Stated>();
  for (const [column, cell] of Object.entries(dataset.conditions)) {
    const stated = conditionOfName(column);
    const put = stated && !taken.has(stated) ? place(conditions, stated, cell, column) : false;
    if (stated && put) {
      taken.add(stated);
      said.push(`“${column}” is read as “${CONDITION_LABELS[stated]}”.`);
    } else {
      notes.push(`${column}: ${cell}`);
      said.push(`“${column}” fits no condition and is kept in the notes.`);
    }
  }
  const { trials, unit, geometry, misread, misreadUncertainty, kept } = dataset.suggested;
  if (trials !== undefined && trials !== null) {
    conditions.trials = trials;
    conditions.trialsWhy = 'Stated in the file.';
  }
  if (unit) conditions.unit = unit;
  if (geometry) conditions.geometry = geometry;
  if (misread !== undefined) conditions.misread = misread;
  if (misreadUncertainty !== undefined) conditions.misreadUncertainty = misreadUncertainty;
  if (kept) conditions.kept = writeKept(kept);
  const all = [conditions.notes, ...notes].filter((note) => note !== null).join('\n');
  conditions.notes = all === '' ? null : all.slice(0, LENGTHS.notes);
  return { conditions, said };
}

/** Puts a cell where it belongs. @returns false when the cell cannot be that condition */
function place(conditions: Conditions, stated: Stated, cell: string, column: string): boolean {
  const text = cell.trim();
  switch (stated) {
    case 'quenchTime':
    case 'holdTime': {
      const read = readTime(text, column);
      if (!read) return false;
      conditions[stated] = read.time;
      conditions[stated === 'quenchTime' ? 'quenchUnit' : 'holdUnit'] = read.unit;
      return true;
    }
    case 'trials': {
      const trials = Number(text);
      if (!Number.isInteger(trials) || trials < 1 || trials > 1e9) return false;
      conditions.trials = trials;
      conditions.trialsWhy = 'Stated in the file.';
      return true;
    }
    case 'misread':
    case 'misreadUncertainty': {
      const misread = Number(text.replace(',', '.'));
      if (text === '' || !(misread >= 0 && misread < 0.5)) return false;
      conditions[stated] = misread;
      return true;
    }
    case 'kept': {
      const kept = readKept(text);
      if (kept) conditions.kept = writeKept(kept);
      return kept !== null;
    }
    case 'geometry': {
      const geometry = readGeometry(text);
      if (geometry) conditions.geometry = geometry;
      return geometry !== null;
    }
    case 'unit': {
      const unit = readUnit(text);
      if (unit) conditions.unit = unit;
      return unit !== null;
    }
    case 'measuredOn':
      conditions.measuredOn = readDay(text);
      return conditions.measuredOn !== null;
    default:
      if (text.length > LENGTHS[stated]) return false;
      conditions[stated] = text || null;
      return true;
  }
}
