const WALKS = /^(Arrow|Page|Home$|End$)/;

interface Asks {
  answer: () => void;
  /** For a part that could not be made live: what was asked is not done much later. */
  forget: () => void;
  stop: () => void;
}

/**
 * Keeps what is asked of a part before it is live: keys that walk a chart, touches, buttons and forms. The rest the
 * browser does by itself, and `keepTyped` sees to what stands in fields. The first sign of being wanted calls `wanted`; `answer` repeats the asks once the part is live.
 */
export function asksOfPart(place: HTMLElement, wanted: () => void): Asks {
  const asked: (() => void)[] = [];
  const stopping = new AbortController();
  const { signal } = stopping;

  place.addEventListener('focusin', wanted, { signal });
  place.addEventListener('pointermove', wanted, { signal });
  place.addEventListener(
    'keydown',
    (event) => {
      wanted();
      const on = event.target as Element;
      if (on.getAttribute('role') !== 'application' || !WALKS.test(event.key)) return;
      // What a chart could answer from its markup is answered (first-reading.ts).
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
      event.preventDefault();
      const { key } = event;
      asked.push(() => on.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true })));
    },
    { signal }
  );
  place.addEventListener(
    'pointerdown',
    (event) => {
      wanted();
      const on = event.target as Element;
      const { clientX, clientY, pointerType } = event;
      const again = { clientX, clientY, pointerType, bubbles: true };
      asked.push(() => on.isConnected && on.dispatchEvent(new PointerEvent('pointerdown', again)));
    },
    { signal }
  );
  place.addEventListener(
    'click',
    (event) => {
      wanted();
      const button = (event.target as Element).closest('button');
      if (button && !(button.form && button.type === 'submit')) asked.push(() => button.click());
    },
    { signal }
  );

  // A form that posts is sent by the browser itself; one without an address is its script's alone.
  place.addEventListener(
    'submit',
    (event) => {
      wanted();
      const form = event.target as HTMLFormElement;
      if (form.method === 'post') return;
      event.preventDefault();
      asked.push(() => form.requestSubmit());
    },
    { signal }
  );
  place.addEventListener('change', wanted, { signal });

  return {
    answer: () => {
      stopping.abort();
      for (const ask of asked) ask();
    },
    forget: () => void asked.splice(0),
    stop: () => stopping.abort()
  };
}
