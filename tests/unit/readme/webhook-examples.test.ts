import { sendMessage } from '$lib/server/services/webhooks/send-message';
import { signMessage } from '$lib/server/services/webhooks/sign-message';
import { execFileSync, spawn, type ChildProcess } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

/** The examples as they stand in the README, run as they are. */
const section = /^## Webhooks$(.*?)^## /ms.exec(readFileSync('README.md', 'utf8'))![1];
const example = (language: string): string =>
  new RegExp(`^\`\`\`${language}$\n(.*?)^\`\`\`$`, 'ms').exec(section)![1];

const secret = `whsec_${Buffer.alloc(32, 11).toString('base64')}`;
const otherSecret = `whsec_${Buffer.alloc(32, 12).toString('base64')}`;
const body = '{"type":"gate.fail","timestamp":"2026-03-14T15:09:26.000Z","data":{"thing":"version é"}}';
const MINUTE = 60_000;

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'severalty-hook-'));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the listener of the README', () => {
  let child: ChildProcess;
  let url: string;
  let output = '';

  beforeAll(async () => {
    const file = join(folder, 'listener.mjs');
    writeFileSync(file, example('js'));
    const port = await freePort();
    url = `http://127.0.0.1:${port}/`;
    child = spawn(process.execPath, [file], {
      env: { ...process.env, WEBHOOK_SECRET: secret, PORT: String(port) },
      stdio: ['ignore', 'pipe', 'inherit']
    });
    child.stdout!.on('data', (chunk: Buffer) => (output += chunk.toString()));
    await listening(url);
  });
  afterAll(() => child.kill('SIGKILL'));

  const send = (fields: Record<string, string>, text = body) =>
    sendMessage(url, fields, text, { allowInner: true });
  const heard = () => output.split('\n').filter((line) => line !== '');

  it('takes what we sign, once', async () => {
    const now = Date.now();
    expect(await send(signMessage(secret, 'msg-1', now, body))).toEqual({ ok: true, answered: 204 });
    // The same id again: the same bytes, and a second attempt with a moment of its own.
    for (const at of [now, now + 1000])
      expect(await send(signMessage(secret, 'msg-1', at, body))).toEqual({ ok: true, answered: 200 });
    await expect.poll(heard).toEqual(['gate.fail version é']);
  });

  it('refuses what was tampered with, is old, is of the future, or was signed with another key', async () => {
    const before = heard();
    const now = Date.now();
    const good = signMessage(secret, 'msg-2', now, body);
    const refused = [
      await send(good, body.replace('gate.fail', 'gate.pass')),
      await send({ ...good, 'webhook-id': 'msg-3' }),
      await send({ ...good, 'webhook-timestamp': String(Math.floor(now / 1000) + 1) }),
      await send({ ...good, 'webhook-timestamp': 'soon' }),
      await send({ ...good, 'webhook-signature': 'v1,' }),
      await send({}),
      await send(signMessage(otherSecret, 'msg-2', now, body)),
      await send(signMessage(secret, 'msg-2', now - 6 * MINUTE, body)),
      await send(signMessage(secret, 'msg-2', now + 6 * MINUTE, body))
    ];
    expect(refused.map(({ answered }) => answered)).toEqual(refused.map(() => 401));
    expect(heard()).toEqual(before);
    // Nothing of this used the id up.
    expect((await send(good)).answered).toBe(204);
  });

  it('takes a message with several signatures, as while a secret is changed', async () => {
    const now = Date.now();
    const good = signMessage(secret, 'msg-4', now, body);
    const both = `${signMessage(otherSecret, 'msg-4', now, body)['webhook-signature']} ${good['webhook-signature']}`;
    expect((await send({ ...good, 'webhook-signature': both })).answered).toBe(204);
  });
});

describe('the commands of the README', () => {
  function run(fields: Record<string, string>, text = body): string {
    writeFileSync(join(folder, 'body.json'), text);
    const env = {
      ...process.env,
      WEBHOOK_SECRET: secret,
      ID: fields['webhook-id'],
      AT: fields['webhook-timestamp'],
      SIGNATURE: fields['webhook-signature']
    };
    try {
      return execFileSync('sh', ['-c', example('sh')], { cwd: folder, env, stdio: 'pipe' }).toString();
    } catch (error) {
      return `refused: ${(error as { stdout: Buffer }).stdout.toString()}`;
    }
  }

  it('take what we sign, once, and nothing that was tampered with, is old, or has another key', () => {
    const now = Date.now();
    const good = signMessage(secret, 'msg-1', now, body);
    expect(run(good)).toBe('signed, and new\n');
    expect(run(good)).toBe('refused: had before\n');
    expect(run(signMessage(secret, 'msg-1', now + 1000, body))).toBe('refused: had before\n');
    const next = signMessage(secret, 'msg-2', now, body);
    const unsigned = 'refused: not signed with this secret\n';
    expect(run(next, body.replace('gate.fail', 'gate.pass'))).toBe(unsigned);
    expect(run({ ...next, 'webhook-id': 'msg-3' })).toBe(unsigned);
    expect(run(signMessage(otherSecret, 'msg-2', now, body))).toBe(unsigned);
    expect(run({ ...next, 'webhook-signature': '*' })).toBe(unsigned);
    expect(run(signMessage(secret, 'msg-2', now - 6 * MINUTE, body))).toBe('refused: too old, or too new\n');
    expect(run(signMessage(secret, 'msg-2', now + 6 * MINUTE, body))).toBe('refused: too old, or too new\n');
  });

  it('run nothing that a header field says', () => {
    const good = signMessage(secret, 'msg-5', Date.now(), body);
    expect(run({ ...good, 'webhook-timestamp': 'a[$(touch made)]' })).toBe('refused: too old, or too new\n');
    expect(existsSync(join(folder, 'made'))).toBe(false);
  });
});

/** Waits until something answers there: half a minute, a hundred times what Node takes to start. */
async function listening(url: string): Promise<void> {
  const late = Date.now() + 30_000;
  while (!(await fetch(url).catch(() => null))) {
    if (Date.now() > late) throw new Error('The listener of the README does not listen.');
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

function freePort(): Promise<number> {
  return new Promise((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => {
      const { port } = server.address() as AddressInfo;
      server.close(() => resolve(port));
    });
  });
}
