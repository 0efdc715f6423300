import { parseArgs } from 'node:util';
import { nuisances } from '$lib/stats/calibration/nuisances';
import { truths } from '$lib/stats/calibration/truths';
import { violations } from '$lib/stats/calibration/violations';

export const usage = `npm run calibrate -- [options]
  --quick             40 repeats at S = 300 and 3000 (about two minutes on two cores)
  --repeats N         repeats of each truth (300; 200 from S = 30000 on) and of each violation (a third of that)
  --shots A,B         numbers of shots (300,3000,30000; violations: the first two)
  --truth A,B         only truths whose name begins so; "none" for none
  --violation A,B     only violations whose name begins so; "none" for none
  --nuisance A,B      nuisances whose name begins so, without and with twice the smallest excess; "all" (none)
  --plans             instead: the planner's power beside simulated power, over a grid of plans
  --gates             instead: how simulated gates of firmware versions end, without and with a rise (--repeats each)
  --printed           instead: answers from printed cumulants alone, false alarms and power (--repeats each)
  --resamples N       resamples of each diagnosis (399)
  --full N            resamples the answer at 0.01 is decided with (1999)
  --seed N            seed of everything (1)
  --threads N         threads to work in (2)
  --json FILE         write all shares as JSON
Truths: ${truths.map(({ id }) => id).join(', ')}
Violations: ${violations.map(({ id }) => id).join(', ')}
Nuisances: ${nuisances.map(({ id }) => id).join(', ')}`;

export interface CalibrateArguments {
  repeats(shots: number): number;
  shots: number[];
  truths: string[];
  violations: string[];
  nuisances: string[];
  resamples: number;
  full: number;
  seed: number;
  threads: number;
  json: string | null;
  /** What is done instead of diagnoses. */
  instead: ('plans' | 'printed' | 'gates')[];
}

/** What the command line asks for, or the complaint about it. */
export function readArguments(
  args: string[]
): { ok: true; asked: CalibrateArguments } | { ok: false; reason: string } {
  try {
    const { values } = parseArgs({
      args,
      options: {
        quick: { type: 'boolean' },
        plans: { type: 'boolean' },
        gates: { type: 'boolean' },
        printed: { type: 'boolean' },
        repeats: { type: 'string' },
        shots: { type: 'string' },
        truth: { type: 'string' },
        violation: { type: 'string' },
        nuisance: { type: 'string' },
        resamples: { type: 'string' },
        full: { type: 'string' },
        seed: { type: 'string' },
        threads: { type: 'string' },
        json: { type: 'string' },
        help: { type: 'boolean' }
      }
    });
    if (values.help) return { ok: false, reason: usage };
    const repeats = values.repeats ? whole('repeats', values.repeats) : null;
    const usual = values.quick ? '300,3000' : '300,3000,30000';
    return {
      ok: true,
      asked: {
        repeats: (shots) => repeats ?? (values.quick ? 40 : shots >= 30_000 ? 200 : 300),
        shots: (values.shots ?? usual).split(',').map((text) => whole('shots', text)),
        truths: chosen('truth', values.truth, truths),
        violations: chosen('violation', values.violation, violations),
        nuisances: chosen('nuisance', values.nuisance ?? 'none', nuisances),
        resamples: whole('resamples', values.resamples ?? '399'),
        full: whole('full', values.full ?? '1999'),
        seed: whole('seed', values.seed ?? '1'),
        threads: whole('threads', values.threads ?? '2'),
        json: values.json ?? null,
        instead: [
          values.plans && ('plans' as const),
          values.printed && ('printed' as const),
          values.gates && ('gates' as const)
        ].filter((one) => one !== undefined && one !== false)
      }
    };
  } catch (error) {
    return { ok: false, reason: error instanceof Error ? error.message : String(error) };
  }
}

function whole(name: string, text: string): number {
  const value = Number(text);
  if (!Number.isSafeInteger(value) || value < 1)
    throw new Error(`--${name} needs whole numbers from 1, not "${text}"`);
  return value;
}

function chosen(name: string, asked: string | undefined, all: { id: string }[]): string[] {
  const ids = all.map(({ id }) => id);
  if (asked === undefined || asked === 'all') return ids;
  if (asked === 'none') return [];
  return asked.split(',').flatMap((start) => {
    const found = ids.filter((id) => id.startsWith(start));
    if (found.length === 0) throw new Error(`--${name} ${start}: there is none; there are ${ids.join(', ')}`);
    return found;
  });
}
