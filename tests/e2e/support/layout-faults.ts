import type { Page } from 'playwright-core';

/**
 * What is wrong with how a page is laid out at its present width, one line each: content wider than the window, words cut
 * off by a box too small for them, labels of a drawing that leave it or lie on each other.
 */
export function layoutFaults(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const faults: string[] = [];
    const say = (element: Element) => {
      const text = (element.textContent ?? '').replace(/\s+/g, ' ').trim().slice(0, 50);
      return `<${element.tagName.toLowerCase()} class="${element.getAttribute('class') ?? ''}"> ${text}`;
    };
    const root = document.documentElement;
    // Half a pixel is rounding.
    if (root.scrollWidth > window.innerWidth + 0.5) {
      const widest = [...document.body.querySelectorAll('*')]
        .map((element) => ({ element, right: element.getBoundingClientRect().right }))
        .filter(({ element }) => !element.closest('[data-scrolls]'))
        .sort((a, b) => b.right - a.right)[0];
      faults.push(`${root.scrollWidth} wide in ${window.innerWidth}: ${say(widest.element)}`);
    }
    for (const element of document.body.querySelectorAll<HTMLElement>('*')) {
      const own = [...element.childNodes].some((node) => node.nodeType === 3 && node.textContent?.trim());
      if (!own || element.clientWidth === 0 || !element.checkVisibility()) continue;
      const { overflowX, overflowY, clipPath } = getComputedStyle(element);
      // Words for screen readers alone are clipped on purpose.
      if (clipPath !== 'none' || element.clientWidth <= 1) continue;
      const cuts = (overflow: string) => overflow === 'hidden' || overflow === 'clip';
      const wide = cuts(overflowX) && element.scrollWidth > element.clientWidth + 1;
      const high = cuts(overflowY) && element.scrollHeight > element.clientHeight + 1;
      if (wide || high) faults.push(`words cut off: ${say(element)}`);
    }
    for (const drawing of document.querySelectorAll('svg')) {
      const frame = drawing.getBoundingClientRect();
      if (frame.width === 0 || !drawing.checkVisibility()) continue;
      const labels = [...drawing.querySelectorAll('text')]
        .map((text) => ({ text, box: text.getBoundingClientRect() }))
        .filter(({ box }) => box.width > 0);
      for (const { text, box } of labels) {
        if (box.left < frame.left - 1 || box.right > frame.right + 1 || box.bottom > frame.bottom + 2)
          faults.push(`a label leaves its drawing: ${say(text)}`);
      }
      labels.forEach(({ text, box }, i) => {
        for (const other of labels.slice(i + 1)) {
          const across = Math.min(box.right, other.box.right) - Math.max(box.left, other.box.left);
          const down = Math.min(box.bottom, other.box.bottom) - Math.max(box.top, other.box.top);
          // A line box is a third higher than its letters.
          if (across > 1 && down > 0.4 * Math.min(box.height, other.box.height))
            faults.push(`labels lie on each other: ${say(text)} and ${say(other.text)}`);
        }
      });
    }
    return faults;
  });
}
