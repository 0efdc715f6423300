import type { ConditionName } from './conditions';
import type { TypedConditions } from './typed-conditions';

/** What somebody else changed in one field while it was open here. */
export interface OthersChange {
  name: ConditionName;
  label: string;
  from: string;
  to: string;
  /** This person changed it too: what they typed stands in the field. */
  both: boolean;
}

/** Told to the second of two editors of the same conditions. */
export interface StaleEdit {
  /** Version that stands now, to save over knowingly. */
  version: number;
  /** What stands now: the next comparison starts from it. */
  before: TypedConditions;
  /** Who was faster; null when that person is gone. */
  by: string | null;
  at: number;
  others: OthersChange[];
}
