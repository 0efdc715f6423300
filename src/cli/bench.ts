import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { isMainThread } from 'node:worker_threads';
import { benchDiagnoses, benchPmf, benchRefits } from './bench/sections';
import { diagnosisChild } from './bench/time-diagnosis';
import { compileLater } from './shared/compile-later';
import { serveDraws } from './shared/second-thread';

const usage = `npm run bench -- [--only refits,diagnoses,pmf] [--peers DIR [--python PROGRAM]]
  --peers DIR   a scratch copy of the folder with fit_scipy.py, fit.R and pmf.R: timed in the same run
  --python P    the Python that has NumPy and SciPy (python3)`;

const sections = ['refits', 'diagnoses', 'pmf'];

/** `npm run bench`: CPU times of this machine, medians of seven; beside SciPy and R where they are. */
const { values } = parseArgs({
  options: {
    only: { type: 'string' },
    peers: { type: 'string' },
    python: { type: 'string', default: 'python3' },
    child: { type: 'string' },
    alone: { type: 'boolean' },
    help: { type: 'boolean' }
  }
});
const only = values.only?.split(',') ?? sections;
const peers = values.peers ? { folder: values.peers, python: values.python } : null;
const script = fileURLToPath(import.meta.url);
if (isMainThread) compileLater();
if (!isMainThread) {
  serveDraws();
} else if (values.child) {
  await diagnosisChild(values.child, values.alone ? null : script);
} else if (values.help || only.some((name) => !sections.includes(name))) {
  console.error(usage);
  process.exit(2);
} else if (peers !== null && !existsSync(join(peers.folder, 'fit_scipy.py'))) {
  console.error(`--peers ${peers.folder}: there is no fit_scipy.py in it`);
  process.exit(2);
} else {
  if (only.includes('refits')) benchRefits(peers);
  if (only.includes('diagnoses')) benchDiagnoses(script);
  if (only.includes('pmf')) benchPmf(peers);
}
