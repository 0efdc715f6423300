import type { RequestEvent } from '@sveltejs/kit';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { reportError } from '$lib/server/handles/report-error';

const event = {
  locals: {},
  request: new Request('http://localhost/?counts=0,185', { method: 'POST' }),
  route: { id: '/samples/[slug]' },
  url: new URL('http://localhost/?counts=0,185')
} as unknown as RequestEvent;

afterEach(() => void vi.restoreAllMocks());

describe('reportError', () => {
  it('logs an unforeseen error under the number it tells the person', async () => {
    const written = captureLog();
    const told = await reportError({
      error: new Error('disk on fire'),
      event,
      status: 500,
      message: 'Internal Error'
    });
    const entry = JSON.parse(written.join('')) as Record<string, unknown>;
    expect(told).toMatchObject({ code: 'internal', errorId: entry.errorId });
    expect(entry).toMatchObject({ level: 'error', status: 500, method: 'POST', route: '/samples/[slug]' });
    expect(entry.stack).toMatch(/disk on fire/);
    // The reason is for the log; the person is told only where to find it.
    expect(JSON.stringify(told)).not.toContain('fire');
  });

  it('never writes the counts that an address carries', async () => {
    const written = captureLog();
    await reportError({ error: 'thrown text', event, status: 500, message: 'Internal Error' });
    expect(written.join('')).not.toContain('185');
  });

  it('tells of a locked database in words, leaves its stack out of the log, and marks the request for a 503', async () => {
    const written = captureLog();
    const locked = Object.assign(new Error('database is locked'), { code: 'SQLITE_BUSY' });
    const told = await reportError({
      error: new Error('query', { cause: locked }),
      event,
      status: 500,
      message: ''
    });
    expect(told).toMatchObject({ code: 'database-busy', message: expect.stringMatching(/try again/) });
    expect(event.locals.storageTrouble).toBe('busy');
    expect(written).toHaveLength(1);
    expect(written[0]).not.toContain('stack');
  });

  it('does not log an address that leads nowhere', async () => {
    const written = captureLog();
    const told = await reportError({ error: new Error('x'), event, status: 404, message: 'Not Found' });
    expect(told).toEqual({ message: 'There is no page at this address.', code: 'not-found' });
    expect(written).toEqual([]);
  });
});

function captureLog(): string[] {
  const lines: string[] = [];
  vi.spyOn(process.stderr, 'write').mockImplementation((text) => {
    lines.push(String(text));
    return true;
  });
  return lines;
}
