import { table } from '../shared/table';
import { median } from './cpu';
import { diagnosisCases } from './diagnosis-case';
import { runPeer, type PeerOutcome, type Peers } from './peers';
import { pmfPeer } from './pmf-peer';
import { readRefitCase, type RefitCaseId } from './refit-case';
import { timeDiagnosis } from './time-diagnosis';
import { timePmf } from './time-pmf';
import { timeRefits } from './time-refits';

/** Refits that each contender is given; the time of one is then scaled. R takes half a second for each of lz32. */
const peerRefits: Record<RefitCaseId, { SciPy: number; R: number }> = {
  weldon12: { SciPy: 199, R: 199 },
  lz32: { SciPy: 199, R: 20 },
  lz256: { SciPy: 5, R: 0 }
};

/** Fit and 199 refits of the three cases, beside SciPy and R. */
export function benchRefits(peers: Peers | null): void {
  const rows: string[][] = [];
  for (const id of ['weldon12', 'lz32', 'lz256'] as const) {
    const own = timeRefits(readRefitCase(id));
    const whole = own.fitSeconds + 199 * own.refitSeconds;
    const reached =
      own.close === null
        ? ''
        : `${own.close} of ${own.refits} within 1e-3 nats, furthest ${own.furthest!.toExponential(1)}`;
    rows.push([id, 'Severalty', ...seconds(own.fitSeconds, own.refitSeconds, whole), '', reached]);
    for (const which of ['SciPy', 'R'] as const) {
      const refits = peerRefits[id][which];
      if (peers === null || refits === 0) continue;
      rows.push(peerRow(id, which, runPeer(which, peers, id, refits), whole));
    }
  }
  print('Fit and 199 refits, CPU milliseconds', [
    ['case', 'engine', 'fit', 'one refit', 'fit + 199', 'times Severalty', 'reached'],
    ...rows
  ]);
}

function peerRow(id: string, which: string, peer: PeerOutcome, own: number): string[] {
  if (!peer.ok) return [id, which, '', '', '', '', peer.reason];
  const { fitSeconds, refitSeconds, refits, short } = peer.times;
  const whole = fitSeconds + 199 * refitSeconds;
  const reached = `${refits - short} of ${refits} within 1e-3 nats`;
  return [id, which, ...seconds(fitSeconds, refitSeconds, whole), (whole / own).toFixed(0), reached];
}

/** Whole diagnoses with 1999 resamples, each seven times in a process of its own. */
export function benchDiagnoses(script: string): void {
  const rows = diagnosisCases.map(({ id, histogram, limit }) => {
    const shots = histogram().counts.reduce((sum, [, seen]) => sum + seen, 0);
    const runs = Array.from({ length: 7 }, () => timeDiagnosis(script, id));
    const middle = (of: (run: (typeof runs)[number]) => number) => median(runs.map(of));
    return [
      id,
      String(shots),
      middle((run) => run.cpuSeconds).toFixed(2),
      middle((run) => run.seconds).toFixed(2),
      String(limit),
      (1000 * middle((run) => run.fitSeconds)).toFixed(0),
      middle((run) => run.memory).toFixed(0),
      String(runs[0].draws),
      runs[0].verdict
    ];
  });
  print('Whole diagnoses with up to 1999 resamples, first one of a process', [
    ['case', 'shots', 'CPU s', 'passed s', 'limit s', 'first fit ms', 'memory MB', 'draws', 'answer'],
    ...rows
  ]);
}

/** The full pmf of N different probabilities, beside R's best exact method. */
export function benchPmf(peers: Peers | null): void {
  const peer = peers === null ? null : pmfPeer(peers);
  const rows = (['uniform', 'small'] as const).flatMap((kind) =>
    [12, 64, 512, 2000, 10_000].map((trials) => {
      const own = timePmf(trials, kind);
      const theirs = peer?.get(`${kind} ${trials}`);
      const ratio = (seconds: number) => (theirs ? (theirs / seconds).toFixed(1) : '');
      return [
        `${kind} ${trials}`,
        micro(own.exactSeconds),
        micro(own.cutSeconds),
        theirs ? micro(theirs) : '',
        ratio(own.exactSeconds),
        ratio(own.cutSeconds)
      ];
    })
  );
  print('Full pmf of N different probabilities, CPU microseconds', [
    ['N', 'to 1e-300', 'cut at 1e-18', 'R, best exact', 'times Severalty', 'times, cut'],
    ...rows
  ]);
}

function seconds(...values: number[]): string[] {
  return values.map((value) => (1000 * value).toPrecision(3));
}

function micro(value: number): string {
  return (1e6 * value).toPrecision(3);
}

function print(title: string, [head, ...rows]: string[][]): void {
  console.log(`${title}\n${table(head, rows)}\n`);
}
