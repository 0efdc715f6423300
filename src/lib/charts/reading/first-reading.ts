import { splitRaised } from '../split-raised';
import { endFirstReading } from './end-first-reading';
import { nearestReading } from './nearest-reading';
import { pointIn } from './point-in';
import { walkedTo } from './walked-to';
import type { WrittenReadings } from './written-readings';

// Reads out charts that the server drew, from the words in their markup, until their own script makes them live
// (Drawing.svelte): a slow processor needs a second for that. Comes inside the page, so it stands alone and small.

const SVG = 'http://www.w3.org/2000/svg';

const parsed = new WeakMap<Element, WrittenReadings>();

/** The chart that an event is about, if it still has its words in its markup. */
const chartOf = (event: Event): SVGSVGElement | null =>
  event.target instanceof Element ? event.target.closest<SVGSVGElement>('svg[data-readings]') : null;

function pictureOf(chart: SVGSVGElement) {
  let written = parsed.get(chart);
  if (!written) parsed.set(chart, (written = JSON.parse(chart.dataset.readings!) as WrittenReadings));
  return {
    order: written.order,
    readings: written.readings.map(([x, y, text]) => ({ x, y, words: () => text }))
  };
}

const chosenIn = (chart: SVGSVGElement): number =>
  pictureOf(chart).readings.findIndex(({ words }) => words() === chart.dataset.said);

function choose(chart: SVGSVGElement, chosen: number): void {
  const figure = chart.closest('figure')!;
  endFirstReading(figure);
  const reading = pictureOf(chart).readings[chosen];
  if (!reading) return void delete chart.dataset.said;
  chart.dataset.said = reading.words();

  const ring = document.createElementNS(SVG, 'circle');
  const looks = {
    cx: reading.x,
    cy: reading.y,
    r: 9,
    fill: 'none',
    stroke: 'var(--ink)',
    'stroke-width': 1.5
  };
  for (const [name, value] of Object.entries(looks)) ring.setAttribute(name, String(value));
  ring.dataset.firstReading = '';
  chart.append(ring);

  const said = document.createElement('span');
  said.dataset.firstReading = '';
  for (const { text, raised } of splitRaised(reading.words())) {
    said.append(text);
    if (raised) said.appendChild(document.createElement('sup')).textContent = raised;
  }
  figure.querySelector('[aria-live]')?.append(said);
  figure.querySelector('.keys')?.classList.add('sr-only');
}

function point(event: PointerEvent): void {
  const chart = chartOf(event);
  if (chart)
    choose(chart, nearestReading(pictureOf(chart), ...pointIn(chart, chart.viewBox.baseVal.width, event)));
}

// Before the page's own listeners: the first sign of interest has the chart made live, which ends this.
const first = { capture: true };
addEventListener('pointermove', point, first);
addEventListener('pointerdown', point, first);
addEventListener(
  'pointerout',
  (event) => {
    const chart = chartOf(event);
    const stays = event.relatedTarget instanceof Node && chart?.contains(event.relatedTarget);
    if (!chart || stays || event.pointerType !== 'mouse' || document.activeElement === chart) return;
    choose(chart, -1);
  },
  first
);
addEventListener(
  'keydown',
  (event) => {
    const chart = chartOf(event);
    const to = chart && walkedTo(event, pictureOf(chart), chosenIn(chart));
    if (to === null) return;
    event.preventDefault();
    if (to < 0) event.stopPropagation();
    choose(chart!, to);
  },
  first
);
