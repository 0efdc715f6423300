/**
 * Complaints without those of requests that the test itself cut off: a load of data that the next step overtook, and
 * the navigation that became a download, which the browser reports as broken off.
 */
export function notOvertaken(complaints: string[]): string[] {
  return complaints.filter(
    (line) => !/^failed: \S*(__data\.json\S*|\/settings\/export) net::ERR_ABORTED$/.test(line)
  );
}
