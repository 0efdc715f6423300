import type { LogDispersion } from './log-dispersion';
import type { KnownInterval } from './types';

/** 97.5 % quantile of a normal law. */
const OUTER = 1.959963984540054;

/** Variance over ceiling with its 95 % interval, D·exp(±1.96·error of ln D), which keeps it above 0. */
export function dispersionInterval({ log, error }: Pick<LogDispersion, 'log' | 'error'>): KnownInterval {
  return {
    value: Math.exp(log),
    low: Math.exp(log - OUTER * error),
    high: Math.exp(log + OUTER * error)
  };
}
