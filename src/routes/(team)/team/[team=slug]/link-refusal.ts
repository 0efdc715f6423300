import { TOO_FEW_TO_HIDE } from '$lib/model/link/hides-counts';
import { problem } from '../../../problem';

type Reason = 'unknown' | 'not-allowed' | 'past' | 'too-few-counts' | 'shows-counts' | 'no-remarks';

const REFUSALS: Record<Reason, { status: number; code: string; title: string; detail?: string }> = {
  unknown: { status: 404, code: 'not-found', title: 'There is nothing at this address.' },
  'not-allowed': {
    status: 403,
    code: 'not-allowed',
    title: 'Links are made and closed by leads, and by those who made what they open.'
  },
  past: { status: 422, code: 'past', title: 'The link would have expired already: choose a later day.' },
  'too-few-counts': {
    status: 422,
    code: 'too-few-counts',
    title: TOO_FEW_TO_HIDE,
    detail: 'Make a link that shows report and counts, or none.'
  },
  'shows-counts': {
    status: 422,
    code: 'shows-counts',
    title:
      'A sweep shows the cumulants of each dataset to their last digit: beside them its counts cannot be kept back.'
  },
  'no-remarks': {
    status: 422,
    code: 'no-remarks',
    title: 'A sweep takes no remarks: make the link without them.'
  }
};

/** Problem details for what the services of links refuse. */
export const linkRefusal = (reason: Reason): Response => problem(REFUSALS[reason]);
