import { z } from 'zod';

/** Datasets that one request may name: as many as may wait for a team. */
export const MOST_JOBS = 1000;

/** A typed number; an empty field counts as left out. */
const typed = z.preprocess(
  (given) => (typeof given === 'string' ? (given.trim() === '' ? undefined : Number(given)) : given),
  z.number().optional()
);

/** How hard to look, where it differs from what is usual; ranges are checked by the engine's own checkOptions. */
export const hardnessSchema = z.strictObject({
  resamples: typed,
  alpha: typed,
  seed: typed,
  tolerance: typed
});

export type Hardness = z.infer<typeof hardnessSchema>;

export const jobRequestSchema = hardnessSchema.extend({
  dataset: z
    .preprocess((given) => (typeof given === 'string' ? [given] : given), z.array(z.string().min(1).max(100)))
    .refine((list) => list.length > 0, 'Choose at least one dataset.')
    .refine((list) => list.length <= MOST_JOBS, `Choose at most ${MOST_JOBS} datasets.`)
});

export type JobRequest = z.infer<typeof jobRequestSchema>;

/** The fields of a form as a request: `dataset` repeated, the others once; fields of other names are left out. */
export function requestOfForm(form: FormData): Record<string, unknown> {
  const text = (name: string) => {
    const value = form.get(name);
    return typeof value === 'string' ? value : undefined;
  };
  return {
    dataset: form.getAll('dataset').filter((value) => typeof value === 'string'),
    ...Object.fromEntries(Object.keys(hardnessSchema.shape).map((name) => [name, text(name)]))
  };
}
