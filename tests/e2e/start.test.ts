import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { connect, createServer, type AddressInfo, type Server } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { sessionOf } from './support/session-of';
import { startServer } from './support/start-server';

describe('the start command', () => {
  it('makes the data folder, serves the samples, and ends with code 0 and a closed database', async () => {
    const data = join(mkdtempSync(join(tmpdir(), 'severalty-start-')), 'new', 'folder');
    const server = await startServer({ SEVERALTY_DATA: data });
    expect(existsSync(join(data, 'severalty.sqlite'))).toBe(true);
    const response = await fetch(`${server.address}/samples/forty-shots`);
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
    const sample = (await response.json()) as { text: string };
    expect(sample).toMatchObject({
      trials: 64,
      unit: 'defect',
      geometry: 'sites',
      fileName: 'forty-shots.csv'
    });
    expect(sample.text).toMatch(/^# Invented data/);
    expect(await server.stop()).toBe(0);
    // SQLite removes its write-ahead log when the last connection closes.
    expect(readdirSync(data)).toEqual(['auth-secret', 'severalty.sqlite']);
    rmSync(data, { recursive: true });
  });

  it('makes an invented team on this machine, and prints how to sign in as each role', async () => {
    const server = await startServer({ SEVERALTY_DEMO: 'yes' });
    await expect.poll(() => server.output()).toMatch(/each with the password/);
    const [, password] = /password "([^"]+)"/.exec(server.output())!;
    const people = [...server.output().matchAll(/^ {2}(lead|experimenter|observer) +(\S+@\S+)$/gm)];
    expect(people.map(([, role]) => role)).toEqual(['lead', 'experimenter', 'observer']);
    for (const [, role, email] of people) {
      const cookie = await sessionOf(server.address, email, password);
      const status = async (path: string) =>
        (await fetch(`${server.address}/team/wrackline-bay/${path}`, { headers: { cookie } })).status;
      expect(await status('datasets')).toBe(200);
      expect(await status('members')).toBe(role === 'lead' ? 200 : 403);
    }
    await server.stop();
  });

  it('answers an unknown sample with 404 and a reason', async () => {
    const server = await startServer();
    const response = await fetch(`${server.address}/samples/nothing`);
    expect(response.status).toBe(404);
    expect(await response.json()).toEqual({
      message: 'There is no sample of that name.',
      code: 'unknown-sample'
    });
    await server.stop();
  });

  it('cuts connections that stay open after SHUTDOWN_TIMEOUT', async () => {
    const server = await startServer({ SHUTDOWN_TIMEOUT: '1' });
    const socket = connect(Number(new URL(server.address).port), '127.0.0.1');
    socket.on('error', () => {});
    // Half a request: the server waits for the rest.
    socket.write('POST / HTTP/1.1\r\nhost: localhost\r\ncontent-length: 10\r\n\r\n');
    await new Promise((resolve) => setTimeout(resolve, 300));
    const begin = Date.now();
    expect(await server.stop()).toBe(0);
    expect(Date.now() - begin).toBeLessThan(5000);
  });

  it('ends when npm, which started it, is told to stop', async () => {
    const server = await startServer({}, ['npm', 'run', '--silent', '--ignore-scripts', 'start']);
    await server.stop();
    await expect
      .poll(
        () =>
          fetch(server.address).then(
            () => 'answers',
            () => 'gone'
          ),
        { timeout: 5000 }
      )
      .toBe('gone');
  });

  it('serves hashed files with the same protection as pages', async () => {
    const server = await startServer();
    const page = await (await fetch(server.address)).text();
    const [file] = /_app\/immutable\/[\w./-]+\.js/.exec(page) ?? [];
    const response = await fetch(`${server.address}/${file}`);
    expect(response.status).toBe(200);
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
    await server.stop();
  });

  it('says which port is taken, and takes the next one when none was asked for', async () => {
    const blocker = await occupy(0);
    const port = (blocker.address() as AddressInfo).port;
    const { status, stderr } = run({ PORT: String(port) });
    expect(status).toBe(1);
    expect(stderr).toBe(
      `severalty: Port ${port} is already in use. Stop the program that uses it, or give another PORT.\n`
    );
    blocker.close();

    // 4173 may be in use by somebody else on this machine, which serves as well.
    const first = await occupy(4173).catch(() => null);
    const server = await startServer({ PORT: '' });
    const taken = Number(new URL(server.address).port);
    expect(taken).toBeGreaterThan(4173);
    expect(taken).toBeLessThan(4223);
    await server.stop();
    first?.close();
  });

  it('names an environment variable that does not fit', () => {
    const { status, stderr } = run({ PORT: 'eighty' });
    expect(status).toBe(1);
    expect(stderr).toMatch(/^severalty: These environment variables do not fit\.\nPORT: /);
  });
});

function run(env: Record<string, string>) {
  const data = mkdtempSync(join(tmpdir(), 'severalty-start-'));
  const result = spawnSync(process.execPath, ['build-cli/start.js'], {
    env: { ...process.env, SEVERALTY_DATA: data, ...env },
    encoding: 'utf8',
    timeout: 20_000
  });
  rmSync(data, { recursive: true, force: true });
  return result;
}

function occupy(port: number): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(server));
  });
}
