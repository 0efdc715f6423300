import type { DrawAnswer, FittedJob } from './fitted-draws';

/** Draws from … to − 1, and the questions asked of them, a bit each. */
export interface DrawRange {
  from: number;
  to: number;
  wanted: number;
}

/**
 * Someone who answers draws elsewhere, as a rule in another thread: the engine knows no threads. Lives as long as one
 * diagnosis, and is ended by whoever made it.
 */
export interface DrawHelper {
  /**
   * Answers of a range of draws, in order, as rangeAnswerer gives them. The job is plain, and the same object until
   * another law is drawn from (a diagnosis at several misread rates). A helper that rejects is asked no more, and one that never answers is not waited for.
   */
  answers(job: FittedJob, range: DrawRange): Promise<DrawAnswer[]>;
}
