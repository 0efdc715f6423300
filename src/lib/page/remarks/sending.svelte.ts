import { applyAction } from '$app/forms';
import type { SubmitFunction } from '@sveltejs/kit';
import { NO_ANSWER } from '../team/datasets/fetch-json';

/** State of one small form that posts to an action of its page, and stays in place whatever comes back. */
export class Sending {
  busy = $state(false);
  /** What went wrong, in words; empty when nothing did. */
  trouble = $state('');

  /**
   * For use:enhance. What was typed stays in its field unless it was taken: neither a refusal nor a lost connection
   * replaces the page.
   *
   * @param taken called when the action took it, instead of fetching the whole page again
   */
  submit(taken: (() => unknown) | undefined): SubmitFunction {
    return () => {
      this.busy = true;
      this.trouble = '';
      return async ({ result, update }) => {
        this.busy = false;
        if (result.type === 'error') {
          // What the server refuses comes as a plain object; an Error is the browser's own, in words of its own.
          const { error } = result as { error: unknown };
          const told = error instanceof Error ? undefined : (error as { message?: string } | undefined);
          this.trouble = told?.message ?? NO_ANSWER;
        } else if (result.type === 'success') {
          await update({ reset: true, invalidateAll: taken === undefined });
          await taken?.();
        } else {
          await applyAction(result);
        }
      };
    };
  }
}
