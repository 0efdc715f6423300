import { chmodSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { runPeer, type Peers } from '../../../../src/cli/bench/peers';

let folder: string;
let path: string | undefined;
let peers: Peers;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-peers-'));
  peers = { folder, python: 'python3' };
  path = process.env.PATH;
  process.env.PATH = `${folder}${delimiter}${path ?? ''}`;
});

afterEach(() => {
  process.env.PATH = path;
  rmSync(folder, { recursive: true });
});

/** Stands in for R, so that the test needs none. */
function rscript(body: string): void {
  const file = join(folder, 'Rscript');
  writeFileSync(file, `#!/bin/sh\n${body}\n`);
  chmodSync(file, 0o755);
}

describe('runPeer', () => {
  it('reads CPU seconds and shortfalls from what the script prints', () => {
    rscript(`cat <<'END'
lz32 R num fit: ll -7183.905162 counts 85/22 pmf_calls 1511 conv 0 cpu_s median 0.5040 (8)
lz32 R BFGS num bootstrap 20 cold: cpu_s 9.200 wall 9.310 G2 obs 0.4789 boot median 1.1969 p 0.634 | deficit med 2.2e-08 p95 9.5e-04 max 1.7e-03 n>1e-3 2
END`);
    const peer = runPeer('R', peers, 'lz32', 20);
    if (!peer.ok) throw new Error(peer.reason);
    expect(peer.times.fitSeconds).toBe(0.504);
    expect(peer.times.refitSeconds).toBeCloseTo(0.46, 12);
    expect(peer.times.short).toBe(2);
  });

  it('says why there are no figures', () => {
    rscript('echo "there is no package called PoissonBinomial" >&2; exit 1');
    expect(runPeer('R', peers, 'lz32', 20)).toEqual({
      ok: false,
      reason: 'there is no package called PoissonBinomial'
    });
    rscript('echo something else');
    expect(runPeer('R', peers, 'lz32', 20)).toMatchObject({ ok: false });
  });
});
