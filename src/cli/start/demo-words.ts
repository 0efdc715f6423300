import { DEMO_PASSWORD, type DEMO_PEOPLE } from '$lib/server/services/demo-team/demo-people';

/** How to sign in as each role of the invented team; nothing when it is not there. Shown in local mode alone. */
export function demoWords(address: string, people: typeof DEMO_PEOPLE): string {
  if (people.length === 0) return '';
  const lines = people.map(({ role, email }) => `  ${role.padEnd(13)} ${email}`);
  return `
An invented team is there to look around in. Sign in at ${address}/sign-in as
${lines.join('\n')}
each with the password "${DEMO_PASSWORD}".

`;
}
