import { applyAction } from '$app/forms';
import type { SubmitFunction } from '@sveltejs/kit';

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
          this.trouble =
            (result.error as { message?: string } | undefined)?.message ??
            'The server did not answer. Your text is still here; try again.';
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
