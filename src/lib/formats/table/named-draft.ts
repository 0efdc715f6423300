import type { FormatId } from '../types';
import type { NameClass } from './classify-name';
import type { RoleDraft } from './role-draft';

/** A draft of roles for columns with names, as the steps of `rolesByName` share it. */
export interface NamedDraft {
  draft: RoleDraft;
  /** What each column's name says. */
  classes: NameClass[];
  format: FormatId | 'auto';
  /** Columns without a role whose name is in one of the classes. */
  freeOf: (...wanted: NameClass[]) => number[];
  /** The reason "its name", in words. */
  word: (column: number) => string;
}

/** What to do when the names leave several readings. */
export const sayWhich = 'Say which column holds the count and which the number of shots.';
