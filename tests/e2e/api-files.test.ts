import { FILE_COST, REQUEST_LIMITS } from '$lib/server/auth/request-limits';
import type { Actor } from '$lib/server/services/access/actor';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ask, REPORT_FILES, seedToken } from './support/api';
import { seedPerson, seedTeam, type SeededPerson } from './support/seed-people';
import { seedReports } from './support/seed-reports';
import { sessionOf } from './support/session-of';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let lead: SeededPerson;
let actor: Actor;
let token: string;
let report: string;

beforeAll(async () => {
  server = await startServer();
  lead = await seedPerson(server);
  const team = await seedTeam(server, 'own-team', [[lead, 'lead']]);
  actor = { personId: lead.id, teamId: team.id, role: 'lead' };
  token = await seedToken(server, actor, { scopes: ['read', 'upload'] });
  const made = await seedReports(server, { teamId: team.id, createdBy: lead.id, name: 'Ours' }, [{}]);
  report = made.reports[0];
});

afterAll(() => server?.stop());

const codeOf = async (response: Response) => ((await response.json()) as { code: string }).code;

describe('the files of a report', () => {
  it('are, byte for byte, those of its page', async () => {
    const cookie = await sessionOf(server.address, lead.email, lead.password);
    expect(REPORT_FILES).toContain('/report.pdf');
    for (const file of REPORT_FILES.filter((file) => file !== '')) {
      const mine = await ask(server, token, `/reports/${report}${file}`);
      // The page calls its table of all numbers after the document.
      const at = `${server.address}/team/own-team/reports/${report}${file.replace('numbers.csv', 'document.csv')}`;
      const shown = await fetch(at, { headers: { cookie } });
      expect([mine.status, shown.status], file).toEqual([200, 200]);
      for (const header of ['content-type', 'content-disposition'])
        expect(mine.headers.get(header), file).toBe(shown.headers.get(header));
      const [ours, theirs] = [Buffer.from(await mine.arrayBuffer()), Buffer.from(await shown.arrayBuffer())];
      expect(ours.length, file).toBeGreaterThan(300);
      expect(ours.equals(theirs), file).toBe(true);
    }
  });

  it('count as several requests where the server must make them, and are refused with how long to wait', async () => {
    const poor = await seedToken(server, actor, { name: 'poor' });
    const left = async (path: string) => {
      const response = await ask(server, poor, path);
      expect(response.status).toBe(200);
      return Number(/;r=(\d+)/.exec(response.headers.get('ratelimit') ?? '')?.[1]);
    };
    const first = await left('/team');
    expect(await left(`/reports/${report}/document.json`)).toBe(first - 1);
    expect(await left(`/reports/${report}/report.pdf`)).toBe(first - 1 - FILE_COST);
    expect(await left(`/reports/${report}/bundle.zip`)).toBe(first - 1 - 2 * FILE_COST);
    // An id that is not there costs the same and no time.
    let last = await ask(server, poor, '/reports/none/report.pdf');
    for (let asked = 0; asked < REQUEST_LIMITS.token.quota / FILE_COST && last.status === 404; asked++)
      last = await ask(server, poor, '/reports/none/report.pdf');
    expect([last.status, await codeOf(last)]).toEqual([429, 'too-many-requests']);
    expect(Number(last.headers.get('retry-after'))).toBeGreaterThanOrEqual(1);
  });
});

describe('a form', () => {
  it.each([
    'application/x-www-form-urlencoded',
    'text/plain; charset=utf-8',
    'multipart/form-data; boundary=x'
  ])(
    'as %s, which any page could send, is refused in problem details with or without a token',
    async (type) => {
      for (const by of [token, null]) {
        const refused = await ask(server, by, '/datasets', {
          method: 'POST',
          body: 'count,shots\n0,7\n',
          headers: { 'content-type': type }
        });
        expect(refused.status).toBe(415);
        expect(refused.headers.get('content-type')).toBe('application/problem+json');
        expect(refused.headers.get('x-content-type-options')).toBe('nosniff');
        expect(await codeOf(refused)).toBe('wrong-type');
      }
    }
  );
});
