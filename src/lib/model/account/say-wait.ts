/** How long to wait, as one says it: "12 minutes", "40 seconds". */
export function sayWait(seconds: number): string {
  const minutes = Math.ceil(seconds / 60);
  if (seconds < 60) return seconds === 1 ? '1 second' : `${seconds} seconds`;
  return minutes === 1 ? '1 minute' : `${minutes} minutes`;
}
