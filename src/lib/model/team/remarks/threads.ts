import type { RemarkSection } from './sections';

/** A remark as its reader gets it: names that the reader may not know are already replaced. */
export interface RemarkView {
  id: string;
  body: string;
  /** Who signed it: a name, or "The team", "A referee" where names are hidden. */
  by: string;
  /** Whether it came from the team or through a link. */
  from: 'team' | 'link';
  /** Whether the name was typed by somebody not signed in: it proves nothing. */
  typed: boolean;
  mine: boolean;
  /** To the day, for the team, where the link hides referees. */
  createdAt: number;
}

export interface ThreadView {
  id: string;
  section: RemarkSection;
  remarks: RemarkView[];
  /** When it was settled and by whom; null while it is open. */
  settled: { at: number; by: string } | null;
  /** The link it was begun through, for the team; null for a thread of the team's own, and for readers by link. */
  link: { label: string; blind: boolean; hidesReferees: boolean } | null;
}
