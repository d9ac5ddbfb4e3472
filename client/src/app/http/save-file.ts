import type { HttpResponse } from '@angular/common/http';

/** A file under the name that the api gave it. */
export interface NamedFile {
  readonly name: string;
  readonly file: Blob;
}

/** The file of an answer, named as its `Content-Disposition` says. */
export function namedFile({ headers, body }: HttpResponse<Blob>): NamedFile {
  const [, name = 'second-spanner.pdf'] =
    /filename="([^"]+)"/.exec(headers.get('Content-Disposition') ?? '') ?? [];
  return { name, file: body ?? new Blob() };
}

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
