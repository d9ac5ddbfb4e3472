import { HttpHeaders, HttpResponse } from '@angular/common/http';
import { describe, expect, it } from 'vitest';
import { namedFile } from './save-file';

const answer = (disposition?: string): HttpResponse<Blob> =>
  new HttpResponse({
    body: new Blob(['%PDF']),
    headers: new HttpHeaders(disposition === undefined ? {} : { 'Content-Disposition': disposition }),
  });

describe('a file from the api', () => {
  // RFC 6266, section 4.1: the file's name stands in the parameter `filename`, here as a quoted string.
  it('goes by the name that the api gave it', () => {
    expect(namedFile(answer('inline; filename="tightening-plan-at18-head-nuts.pdf"')).name).toBe(
      'tightening-plan-at18-head-nuts.pdf',
    );
  });

  it('has a name also where the api gave none', () => {
    expect(namedFile(answer()).name).toBe('second-spanner.pdf');
  });
});
