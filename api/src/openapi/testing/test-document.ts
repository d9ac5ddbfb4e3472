import type { OpenApiDocument } from '../document-types.js';
import { documentOf } from '../document.js';
import { allOperations } from '../operations/all-operations.js';

let made: Promise<OpenApiDocument> | undefined;

/** The document of the api, made once for all tests of a file. */
export const testDocument = (): Promise<OpenApiDocument> =>
  (made ??= allOperations().then((all) => documentOf(all, { accessCookie: 'second_spanner_access' })));
