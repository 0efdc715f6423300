import { z } from 'zod';

/** The answer of a report in one word; `compatible` is compatible with independent trials, which is not independent. */
export const verdictSchema = z.enum(['compatible', 'ruled-out', 'undecided']);
