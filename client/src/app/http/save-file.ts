/** Hands a file that the page has read over to the browser, to be kept under a name. */
export function saveFile(document: Document, file: Blob, name: string): void {
  const url = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  // The browser has taken it over by the next turn.
  setTimeout(() => URL.revokeObjectURL(url), 0);
}
