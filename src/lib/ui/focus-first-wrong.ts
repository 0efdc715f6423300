import { tick } from 'svelte';

/** Puts the keyboard into the first field of a form that was refused, once the page shows what is wrong with it. */
export async function focusFirstWrong(form: HTMLElement | undefined): Promise<void> {
  await tick();
  form?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
}
