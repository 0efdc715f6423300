import { capital } from '../words/capital';
import { explanationNames } from './explanation-names';
import type { ExplanationId } from './types';

/** What a measurement would show if the story were at work and no other. */
const signs: Record<ExplanationId, string> = {
  'equal-trials': 'repeat with more shots: under independent trials the excess fades',
  'best-independent': 'repeat with more shots: under independent trials the excess fades',
  'common-cause':
    'keep which trials had a defect: a common cause correlates all pairs alike, however far apart',
  neighbours:
    'keep which sites had a defect: neighbour coupling correlates sites next to each other and dies out with distance',
  'two-settings':
    'keep the order of the shots and the settings logged with them: two settings split the shots into two groups in time',
  bursts:
    'look at the time stamps of the largest counts: bursts coincide with outside events, and a veto removes them',
  'dead-shots':
    'add a check of the preparation to each shot, or a trial that must always fire: dead shots fail it and can be set aside',
  'pair-loss':
    'vary the hold time before the count is read: loss in pairs lowers the mean as it grows and leaves odd and even alone',
  'misread-sites':
    'measure the misread rate of a site on prepared states, or read each shot twice: misread kinks differ between the readings'
};

/** Pairs with one measurement that settles both; keys in the order of `explanationNames`. */
const between: Record<string, string> = {
  'common-cause neighbours':
    'correlate pairs of sites by their distance: alike at all distances speaks for a common cause, dying out for neighbour coupling',
  'common-cause two-settings':
    'split the shots by time or by logged settings: two groups, each within its ceiling, speak for two settings; a spread inside every group for a common cause',
  'neighbours misread-sites':
    'measure the misread rate on prepared states, or read each shot twice: misreads differ between readings, coupled defects stay',
  'common-cause misread-sites':
    'correlate bonds by their distance: misreads tie only bonds that share a site, a common cause ties all',
  'neighbours two-settings':
    'correlate pairs of sites by their distance within one short run: neighbour coupling remains and dies out with distance, two settings vanish',
  'bursts common-cause':
    'look at the time stamps of the largest counts: rare, separate events speak for bursts; a slow wander for a common cause',
  'common-cause dead-shots':
    'flag failed preparations in each shot: without them the excess is gone if dead shots were the cause',
  'dead-shots pair-loss': 'vary the hold time: loss in pairs grows with it, the share of dead shots does not',
  'two-settings dead-shots':
    'look at the shots at the lower setting: dead shots show no defect at all, and fail a check of the preparation',
  'two-settings bursts':
    'look at the order of the shots: two settings lie in blocks, bursts come singly at outside events'
};

/** The measurement that would separate two explanations, as a sentence. */
export function separate(a: ExplanationId, b: ExplanationId): string {
  const settled = between[`${a} ${b}`] ?? between[`${b} ${a}`];
  if (settled) return sentence(settled);
  const independent = (id: ExplanationId) => id === 'equal-trials' || id === 'best-independent';
  if (independent(a)) return sentence(signs[b]);
  if (independent(b)) return sentence(signs[a]);
  return `For ${explanationNames[a]}: ${signs[a]}. For ${explanationNames[b]}: ${signs[b]}.`;
}

const sentence = (words: string): string => `${capital(words)}.`;
