import { readLump } from '../number/read-lump';
import { readOpening } from '../number/read-opening';
import { readWholeNumber } from '../number/read-whole-number';
import type { Guess, Problem, Role } from '../types';
import { normaliseName } from './normalise-name';
import type { Sheet } from './sheet';

/** Rows looked at to tell a column of numbers from one of words. */
const sampleRows = 1000;
const open = { decimal: null, thousands: null };

/** The roles of a sheet's columns while they are being decided. Columns count from 0 here. */
export class RoleDraft {
  readonly roles: (Guess<Role> | null)[];
  problem: Problem | null = null;

  constructor(readonly sheet: Sheet) {
    this.roles = Array.from({ length: sheet.width }, () => null);
  }

  set(column: number, role: Role, why: string, from: Guess<Role>['from'] = 'guessed'): void {
    this.roles[column] = { value: role, from, why };
  }

  /** First column with a role, −1 when none has it. */
  find(role: Role): number {
    return this.roles.findIndex((decided) => decided?.value === role);
  }

  has(role: Role): boolean {
    return this.find(role) !== -1;
  }

  /** Columns without a role yet. */
  free(): number[] {
    return this.roles.flatMap((decided, column) => (decided === null ? [column] : []));
  }

  refuse(message: string, fix: string): void {
    this.problem ??= { line: this.sheet.lines[0] ?? null, column: null, message, fix };
  }

  label(column: number): string {
    const name = this.sheet.names[column];
    return name ? `column "${name}"` : `column ${column + 1}`;
  }

  /** At least half of the filled cells of the first rows are numbers, good or bad, or a lump. */
  isNumeric(column: number): boolean {
    const cells = this.sheet.rows.slice(0, sampleRows).map((row) => row[column]);
    return cells.filter(isNumberLike).length * 2 >= cells.filter((cell) => cell !== '').length;
  }

  /** No two rows agree in all of these columns. */
  isDistinct(columns: number[]): boolean {
    const seen = new Set(this.sheet.rows.map((row) => columns.map((column) => row[column]).join('\u0000')));
    return seen.size === this.sheet.rows.length;
  }

  /** Column meant by a number from 1 or by a header name (as written, or as normalised). */
  lookUp(column: number | string): number {
    if (typeof column === 'number') return column >= 1 && column <= this.sheet.width ? column - 1 : -1;
    const exact = this.sheet.names.indexOf(column.trim());
    if (exact !== -1) return exact;
    const wanted = normaliseName(column);
    return this.sheet.names.findIndex((name) => name !== null && normaliseName(name) === wanted);
  }
}

/** A number, even a refused one such as −3 or 12.5, or the label of a lump; not a word and not empty. */
export function isNumberLike(cell: string): boolean {
  const read = readWholeNumber(cell, open);
  if (read.ok) return true;
  if (read.bad !== 'not-a-number' && read.bad !== 'missing') return true;
  return (readLump(cell, open) ?? readOpening(cell, open)) !== null;
}
