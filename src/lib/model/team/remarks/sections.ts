/** Sections of a report that a remark can be about, in the order of the page. */
export const REMARK_SECTIONS = [
  'answer',
  'data',
  'law',
  'rate',
  'tails',
  'cumulants',
  'tests',
  'flags',
  'explanations',
  'nuisances',
  'method',
  'provenance'
] as const;

export type RemarkSection = (typeof REMARK_SECTIONS)[number];

export const SECTION_NAMES: Record<RemarkSection, string> = {
  answer: 'the answer',
  data: 'what was given',
  law: 'the best law',
  rate: 'the rate function',
  tails: 'the tails',
  cumulants: 'the cumulants',
  tests: 'the tests',
  flags: 'what the counts point to',
  explanations: 'what else it could be',
  nuisances: 'what can look like interaction',
  method: 'the method',
  provenance: 'where the report comes from'
};

/** Section of a part of the result, by the part's id on the page; null for a part that takes no remarks. */
export function sectionOfPart(part: string): RemarkSection | null {
  if (part === 'counts-and-law') return 'law';
  return (REMARK_SECTIONS as readonly string[]).includes(part) ? (part as RemarkSection) : null;
}
