/** One keyboard shortcut. `press` is what the list shows; `single` ones can be switched off. */
export interface Shortcut {
  press: string;
  does: string;
  single: boolean;
  matches: (event: KeyboardEvent) => boolean;
  act: () => void;
}

const bare = (event: KeyboardEvent): boolean => !event.ctrlKey && !event.metaKey && !event.altKey;

/** A shortcut of one letter or sign. */
export const single = (key: string, does: string, act: () => void): Shortcut => ({
  press: key,
  does,
  single: true,
  matches: (event) => bare(event) && event.key === key,
  act
});

const writing = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  (target.isContentEditable || ['TEXTAREA', 'SELECT'].includes(target.tagName) || isTyped(target));

const isTyped = (target: HTMLElement): boolean =>
  target instanceof HTMLInputElement && !['checkbox', 'radio', 'button', 'file'].includes(target.type);

/** The page's shortcuts: those that apply now, whether their list is shown, and whether single keys work. */
class Keys {
  shown = $state(false);
  singles = $state(true);
  /** Those of the page alone; the page takes them away when it is left. */
  own = $state.raw<Shortcut[]>([]);
  /** Those of every page, set by the layout. */
  everywhere = $state.raw<Shortcut[]>([]);
  list = $derived([...this.own, ...this.everywhere]);
  /** Whether the page had a chart to walk when the list was opened. */
  charts = $state(false);

  start(): void {
    try {
      this.singles = localStorage.getItem('single-keys') !== 'off';
    } catch {
      // Storage can be switched off; single keys then start switched on.
    }
  }

  /** Shows the list. A chart is known by the role it has for a screen reader. */
  show(): void {
    this.charts = document.querySelector('main [role=application][aria-roledescription=chart]') !== null;
    this.shown = true;
  }

  setSingles(on: boolean): void {
    this.singles = on;
    try {
      localStorage.setItem('single-keys', on ? 'on' : 'off');
    } catch {
      // The choice then lasts as long as the page.
    }
  }

  /** Handles a key press anywhere on the page. Single keys do nothing while someone writes. */
  handle(event: KeyboardEvent): void {
    if (event.defaultPrevented || document.querySelector('dialog[open]')) return;
    const found = this.list.find((shortcut) => shortcut.matches(event));
    if (!found || (found.single && (!this.singles || writing(event.target)))) return;
    event.preventDefault();
    found.act();
  }
}

export const keys = new Keys();
