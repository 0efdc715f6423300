/** An object of a document whose shape is not checked yet. */
type Loose = Record<string, unknown>;

const isLoose = (value: unknown): value is Loose =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** `value` with the keys it lacks; keys that it has stay as they are. */
const lacking = (value: unknown, absent: Loose): unknown =>
  isLoose(value) ? { ...absent, ...value } : value;

/**
 * A document of an engine that did not write every field yet, with the fields that came later set to what their
 * absence says: not known, none, no limit. A number is never made up; what still does not fit is refused by the schema.
 */
export function olderDocument(value: unknown): unknown {
  if (!isLoose(value)) return value;
  const { data, fit, distribution, nuisances, explanations } = value;
  const corrected = isLoose(fit) ? (fit.divergenceCorrected ?? null) : null;
  return {
    notRun: [],
    cautions: [],
    ...value,
    data: lacking(data, { misread: null, lump: null, ordered: false, batches: null }),
    fit: lacking(fit, {
      certified: false,
      omitted: [],
      shotsToNotice: null,
      divergenceInterval: { value: corrected, low: null, high: null }
    }),
    ...(isLoose(nuisances) && {
      nuisances: {
        ...nuisances,
        // The shots with a defect were tested by their variance alone.
        ...('emptyAside' in nuisances && { emptyAside: lacking(nuisances.emptyAside, { tests: [] }) })
      }
    }),
    // One number of shots a pair was told, and none over all of them.
    ...(isLoose(explanations) && { explanations: lacking(explanations, { shotsToLead: null }) }),
    distribution: Array.isArray(distribution)
      ? distribution.map((point) => lacking(point, { lump: false }))
      : distribution
  };
}
