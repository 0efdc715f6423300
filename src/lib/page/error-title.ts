/** What a page that could not be shown is titled, by the status of its answer: whose turn it is to do what. */
export function errorTitle(status: number): string {
  if (status === 403) return 'Not for your role';
  if (status === 404) return 'There is no page here';
  if (status === 413) return 'That is too large';
  if (status === 429) return 'Too much at once';
  if (status === 503) return 'Not just now';
  if (status >= 400 && status < 500) return 'That could not be done';
  return 'This page could not be made';
}
