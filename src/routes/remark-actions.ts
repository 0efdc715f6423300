import type { RemarkForm } from '$lib/page/remarks/remark-form';
import { fail } from '@sveltejs/kit';
import { takeRemark, takeSettling, type RemarkPlace } from './remark-answers';

const textOf = (form: FormData, name: string): string => {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
};

/** Action `remark` of a page with remarks; what was typed comes back when it is refused. */
export async function remarkAction(place: RemarkPlace, form: FormData) {
  const [section, threadId, body] = ['section', 'threadId', 'body'].map((name) => textOf(form, name));
  const taken = await takeRemark(place, { section, threadId, body });
  if (!taken.ok) {
    const { status, title } = taken.problem;
    const signedAs = textOf(form, 'signedAs');
    return fail(status, {
      remark: { section, threadId, body, message: title, signedAs } satisfies RemarkForm
    });
  }
  const message = taken.missed ? 'The remark was kept. The mail about it could not be sent.' : '';
  return { remark: { section, threadId, body: '', message } satisfies RemarkForm };
}

/** Action `settle`: fields section, threadId, and settled as `yes` or `no`. */
export function settleAction(place: Omit<RemarkPlace, 'address'>, form: FormData) {
  const [section, threadId] = ['section', 'threadId'].map((name) => textOf(form, name));
  const settled = { yes: true, no: false }[textOf(form, 'settled')];
  const taken = takeSettling(place, threadId, { settled });
  const message = taken.ok ? '' : taken.problem.title;
  const remark = { section, threadId, body: '', message } satisfies RemarkForm;
  return taken.ok ? { remark } : fail(taken.problem.status, { remark });
}
