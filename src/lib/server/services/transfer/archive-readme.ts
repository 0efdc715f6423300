import type { Manifest } from '$lib/model/team/transfer/archive-schema';

/** What an archive holds, for people who open it without this program. */
export function archiveReadme({ team, madeAt, leftOut }: Omit<Manifest, 'files'>): Uint8Array {
  const aside = leftOut.datasets + leftOut.reports + leftOut.sweeps;
  return new TextEncoder().encode(
    `Datasets, reports and sweeps that the team "${team.name}" had in Severalty on ${madeAt}, and all that was said about them.

manifest.json     format severalty.team/1: size and sha256 of every other file
team.json         members, and who saved each dataset and made each report
datasets/N.json   counts and conditions of one dataset, format severalty.dataset/1
datasets/N.csv    the same as a table
originals/SHA256  the uploaded files byte for byte, each named by its sha256
reports.json      for each report: its dataset, options, conditions then, remarks and links
reports/N.json    the diagnosis documents byte for byte
sweeps.json       for each sweep: its name, options, and its datasets as they were
sweeps/N.json     the documents of the sweeps byte for byte
events.json       who did what when

Links are told without their tokens: importing opens none of them again.

Not in here: links to sweeps, maps of sites, notes on devices and versions and their order, rules of gates
and how versions stood by them, tokens of scripts, and webhooks. Take the documents of maps through the API. A sweep names
its datasets by the ids they had; after an import its page leads to none of them.
${aside === 0 ? '' : `\n${leftOut.datasets} datasets, ${leftOut.reports} reports and ${leftOut.sweeps} sweeps had been put aside, or went with a dataset put aside, and are left out.\n`}`
  );
}
