import { spawnSync } from 'node:child_process';

/** Where the contenders' scripts lie, in a scratch copy since they write beside themselves; a Python with SciPy. */
export interface Peers {
  folder: string;
  python: string;
}

/** CPU seconds of one contender's fit and of one refit, as its script prints them. */
export interface PeerTimes {
  fitSeconds: number;
  refitSeconds: number;
  refits: number;
  /** Refits further than 1e-3 nats from the best known. */
  short: number;
}

export type PeerOutcome = { ok: true; times: PeerTimes } | { ok: false; reason: string };

/** Lines such as "weldon12 scipy fit: … cpu_s median 0.0116" and "… bootstrap 199 cold: cpu_s 4.1 … n>1e-3 0". */
const fitLine = /fit: .*cpu_s median ([\d.eE+-]+)/;
const bootstrapLine = /bootstrap \d+ \w+: cpu_s ([\d.eE+-]+).*n>1e-3 (\d+)/;

/**
 * Runs a contender on the same histograms: fit_scipy.py or fit.R. `refits` may be fewer than 199
 * where one takes seconds.
 */
export function runPeer(
  which: 'SciPy' | 'R',
  { folder, python }: Peers,
  id: string,
  refits: number
): PeerOutcome {
  const [program, ...args] =
    which === 'SciPy'
      ? [python, 'fit_scipy.py', id, String(refits), '7', 'cold']
      : ['Rscript', 'fit.R', id, String(refits), '7', 'BFGS', 'num', 'cold'];
  const { error, status, stdout, stderr } = spawnSync(program, args, { cwd: folder, encoding: 'utf8' });
  if (error) return { ok: false, reason: error.message };
  if (status !== 0) return { ok: false, reason: stderr.trim().split('\n').at(-1) ?? `exit ${status}` };
  const fit = fitLine.exec(stdout);
  const bootstrap = bootstrapLine.exec(stdout);
  if (!fit || !bootstrap) return { ok: false, reason: 'its output has another form than expected' };
  return {
    ok: true,
    times: {
      fitSeconds: Number(fit[1]),
      refitSeconds: Number(bootstrap[1]) / refits,
      refits,
      short: Number(bootstrap[2])
    }
  };
}
