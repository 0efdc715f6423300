/** Hands a file to the browser's own saving. */
export function saveFile(name: string, content: string | Blob, type = 'text/plain'): void {
  const blob = content instanceof Blob ? content : new Blob([content], { type });
  const link = document.createElement('a');
  link.href = URL.createObjectURL(blob);
  link.download = name;
  link.click();
  // Some browsers begin to read only after the click has been handled.
  setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
}
