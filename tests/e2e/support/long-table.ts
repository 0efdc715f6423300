/**
 * Invented, from a seed: a long table of 12 datasets, three devices under two firmware versions at two quench times.
 * Counts are sums of 24 trials by a generator of its own (Park and Miller 1988), so the file is the same everywhere.
 */
export function longTable(): string {
  let state = 20_260_314;
  const random = () => (state = (state * 48_271) % 2_147_483_647) / 2_147_483_647;
  const rows = ['device,firmware,quench_time_us,sites,date,count,shots'];
  for (const device of ['Kelp', 'Marram', 'Samphire'])
    for (const firmware of ['ebb 3.1', 'ebb 3.2'])
      for (const quench of [1.5, 6]) {
        const seen = new Map<number, number>();
        for (let shot = 0; shot < 200; shot++) {
          let count = 0;
          for (let site = 0; site < 24; site++) if (random() < 0.3 / quench) count++;
          seen.set(count, (seen.get(count) ?? 0) + 1);
        }
        for (const [count, shots] of [...seen].sort((a, b) => a[0] - b[0]))
          rows.push(`${device},${firmware},${quench},24,2026-03-14,${count},${shots}`);
      }
  return rows.join('\n') + '\n';
}
