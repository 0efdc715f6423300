import { authSecret } from '$lib/server/auth/auth-secret';
import { chmodSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';

let folder: string;
beforeEach(() => void (folder = mkdtempSync(join(tmpdir(), 'severalty-secret-'))));
afterEach(() => rmSync(folder, { recursive: true }));

const mode = (file: string) => statSync(file).mode & 0o777;

describe('the key of the sessions', () => {
  it('is made once, kept, and readable by its owner alone', () => {
    const data = join(folder, 'new');
    const made = authSecret({ SEVERALTY_DATA: data });
    expect(made).toMatch(/^[\w-]{43}$/);
    expect(readFileSync(join(data, 'auth-secret'), 'utf8')).toBe(made);
    expect(mode(join(data, 'auth-secret'))).toBe(0o600);
    expect(authSecret({ SEVERALTY_DATA: data })).toBe(made);
  });

  it('differs between folders, and is closed again when a copy has wider rights', () => {
    const file = join(folder, 'auth-secret');
    writeFileSync(file, 'x'.repeat(43));
    chmodSync(file, 0o644);
    expect(authSecret({ SEVERALTY_DATA: folder })).toBe('x'.repeat(43));
    expect(mode(file)).toBe(0o600);
  });

  it('is the one given, where one is', () => {
    expect(authSecret({ AUTH_SECRET: 'given', SEVERALTY_DATA: folder })).toBe('given');
  });

  it('is not taken from a damaged file', () => {
    writeFileSync(join(folder, 'auth-secret'), 'short');
    expect(() => authSecret({ SEVERALTY_DATA: folder })).toThrow(/damaged: remove it/);
  });
});
