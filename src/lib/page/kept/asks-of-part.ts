const WALKS = /^(Arrow|Page|Home$|End$)/;

/**
 * Keeps what is asked of a part before it is live: keys that walk a chart, touches, buttons and choices. The rest the
 * browser does by itself. The first sign of being wanted calls `wanted`; `answer` repeats the asks once the part is live.
 */
export function asksOfPart(place: HTMLElement, wanted: () => void): { answer: () => void; stop: () => void } {
  const asked: (() => void)[] = [];
  const stopping = new AbortController();
  const { signal } = stopping;

  place.addEventListener('focusin', wanted, { signal });
  place.addEventListener('pointerover', wanted, { signal });
  place.addEventListener(
    'keydown',
    (event) => {
      wanted();
      const on = event.target as Element;
      if (on.getAttribute('role') !== 'application' || !WALKS.test(event.key)) return;
      if (event.ctrlKey || event.metaKey || event.altKey) return;
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
      if (button) asked.push(() => button.click());
    },
    { signal }
  );

  place.addEventListener(
    'change',
    (event) => {
      wanted();
      const on = event.target;
      if (!(on instanceof HTMLInputElement) || !['radio', 'checkbox'].includes(on.type)) return;
      const { checked } = on;
      asked.push(() => {
        on.checked = checked;
        on.dispatchEvent(new Event('change', { bubbles: true }));
      });
    },
    { signal }
  );

  return {
    answer: () => {
      stopping.abort();
      for (const ask of asked) ask();
    },
    stop: () => stopping.abort()
  };
}
