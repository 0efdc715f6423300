import { z } from 'zod';

/** A moment as the API writes it: ISO 8601 in UTC, to the millisecond. */
export const momentSchema = z.iso.datetime({ precision: 3 }).describe('ISO 8601, UTC');

/** Milliseconds since 1970 as the API writes them. */
export const isoMoment = (at: number): string => new Date(at).toISOString();
