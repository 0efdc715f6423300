import { browser } from '$app/environment';

export type Light = 'day' | 'night';

/** Day or night lab: follows the system until the person says otherwise; remembered on this machine. */
class LightSwitch {
  chosen = $state<Light | null>(null);
  system = $state<Light>('day');
  readonly current = $derived<Light>(this.chosen ?? this.system);

  /** Call once in the browser, when the page is there. */
  start(): () => void {
    const dark = matchMedia('(prefers-color-scheme: dark)');
    const follow = () => (this.system = dark.matches ? 'night' : 'day');
    follow();
    dark.addEventListener('change', follow);
    const kept = document.documentElement.dataset.light;
    if (kept === 'day' || kept === 'night') this.chosen = kept;
    return () => dark.removeEventListener('change', follow);
  }

  toggle(): void {
    if (!browser) return;
    this.chosen = this.current === 'night' ? 'day' : 'night';
    document.documentElement.dataset.light = this.chosen;
    try {
      localStorage.setItem('light', this.chosen);
    } catch {
      // Storage can be switched off; the choice then lasts as long as the page.
    }
  }
}

export const light = new LightSwitch();
