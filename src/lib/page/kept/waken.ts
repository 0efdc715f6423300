import { flushSync, hydrate, mount, unmount, type Component } from 'svelte';
import { asksOfPart } from './asks-of-part';
import { keepTyped } from './keep-typed';
import { sayNotLoaded } from './say-not-loaded';

/** What makes a part live: at once where it is at hand, or loaded. */
export interface Maker<Props extends Record<string, unknown>> {
  atHand: () => Component<Props> | null;
  load: () => Promise<Component<Props>>;
  /** Whether what the server drew can stand while the reader only looks at it. */
  stands?: (place: HTMLElement) => boolean;
  /** Puts a place back to what the server drew. */
  restore?: (place: HTMLElement) => void;
}

/** A part that will be live, and can be made so before the reader comes near. */
export interface Waking {
  start: () => void;
  /** Takes it away again. */
  stop: () => void;
}

/**
 * Makes a part of a page live in its place. What the server drew stands until the reader comes within half a window of
 * it (where `stands` allows, longer), points at it or focuses it; what was asked of it meanwhile is done then. An empty
 * place is filled at once.
 *
 * A part that does not load stays as it was drawn, and says so when it is asked something. It is tried again then, but
 * browsers remember a script that they could not fetch, so that often only loading the page again helps.
 *
 * @param context what components around the part have set, for those in it
 */
export function waken<Props extends Record<string, unknown>>(
  place: HTMLElement,
  { atHand, load, stands, restore }: Maker<Props>,
  props: Props,
  context?: Map<unknown, unknown>
): Waking {
  const drawn = place.firstChild !== null;
  let made: Record<string, unknown> | null = null;
  let loading = false;
  let gone = false;

  let wanted = false;
  let inside = false;

  const asks = asksOfPart(place, () => {
    wanted = true;
    start();
  });
  const near = new IntersectionObserver(
    (seen) => {
      inside = seen.at(-1)!.isIntersecting;
      look();
    },
    { rootMargin: '50% 0px' }
  );
  // What stands at one size need not at another.
  const size = stands && new ResizeObserver(look);

  function look(): void {
    if (inside && !stands?.(place)) start();
  }

  function stopLooking(): void {
    near.disconnect();
    size?.disconnect();
  }

  function make(Part: Component<Props>): void {
    if (gone || made) return;
    stopLooking();
    // In an empty place nothing was asked, and this may run while the page around it is being made.
    if (!drawn) return void (made = mount(Part, { target: place, props, context }));
    restore?.(place);
    const putBack = keepTyped(place);
    made = hydrate(Part, { target: place, props, context });
    flushSync();
    putBack();
    asks.answer();
  }

  function start(): void {
    if (loading || made) return;
    loading = true;
    load().then(make, failed);
  }

  function failed(): void {
    loading = false;
    asks.forget();
    if (drawn && wanted) sayNotLoaded(place);
  }

  const known = atHand();
  if (drawn) {
    near.observe(place);
    size?.observe(place);
  } else if (known) make(known);
  else start();

  return {
    start,
    stop: () => {
      gone = true;
      stopLooking();
      asks.stop();
      if (made) void unmount(made);
    }
  };
}
