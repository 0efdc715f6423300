import type { Browser, BrowserContext, Page } from 'playwright-core';
import { complaintsOf } from './complaints';
import { seedPerson, seedTeam, type SeededPerson } from './seed-people';
import { seedReports } from './seed-reports';
import { signIn } from './sign-in';
import type { RunningServer } from './start-server';

export interface ReportsSetting {
  lead: SeededPerson;
  observer: SeededPerson;
  /** Lead of another team. */
  stranger: SeededPerson;
  /** Address of the team's reports. */
  root: string;
  datasetId: string;
  /** Three reports of one dataset: N = 3, N = 12, and N = 12 with another seed. */
  reports: string[];
}

/** A team with a lead, an observer and four reports of two datasets, and a stranger in a team of their own. */
export async function reportsSetting(server: RunningServer): Promise<ReportsSetting> {
  const lead = await seedPerson(server, { name: 'Lena Lead' });
  const observer = await seedPerson(server, { name: 'Olaf Observer' });
  const stranger = await seedPerson(server, { name: 'Sven Stranger' });
  const team = await seedTeam(server, 'bay', [
    [lead, 'lead'],
    [observer, 'observer']
  ]);
  await seedTeam(server, 'elsewhere', [[stranger, 'lead']]);
  const place = { teamId: team.id, createdBy: lead.id };
  const slow = await seedReports(server, { ...place, name: 'Slow quench', device: 'Tern' }, [
    { trials: 3 },
    { trials: 12 },
    { trials: 12, seed: 9 }
  ]);
  await seedReports(server, { ...place, name: 'Fast quench', device: 'Knot' }, [{}]);
  return { lead, observer, stranger, root: `${server.address}/team/bay/reports`, ...slow };
}

/** A page of somebody signed in, in a context of their own, and what it complains about. */
export async function pageOf(
  browser: Browser,
  server: RunningServer,
  { email, password }: SeededPerson,
  options: Parameters<Browser['newContext']>[0] = {}
): Promise<{ page: Page; complaints: string[]; context: BrowserContext }> {
  const context = await browser.newContext({ reducedMotion: 'reduce', ...options });
  const page = await context.newPage();
  const complaints = complaintsOf(page);
  await signIn(page, server.address, email, password);
  return { page, complaints, context };
}

/** What of the complaints is real: Kit ends a data request of its own once it has what it wants of it. */
export const real = (complaints: string[]): string[] =>
  complaints.filter((line) => !/__data\.json\S* net::ERR_ABORTED/.test(line));
