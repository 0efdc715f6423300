import { lawWindow } from '../laws/law-window';
import { histogramSampler } from '../random/histogram-sampler';
import type { Generator } from '../random/generator';
import type { Histogram, Law } from '../types';

/** Draws whole histograms of `shots` shots from a law; the cost hardly depends on the number of shots. */
export function lawDraws(law: Law): (random: Generator, shots: number) => Histogram {
  const window = lawWindow(law, 1e-18, 1);
  const sampler = histogramSampler(window.values);
  const into = new Float64Array(window.values.length);
  return (random, shots) => {
    sampler.draw(random, shots, into);
    const counts: [number, number][] = [];
    into.forEach((seen, i) => {
      if (seen > 0) counts.push([window.first + i, seen]);
    });
    return { kind: 'histogram', counts, lump: null };
  };
}
