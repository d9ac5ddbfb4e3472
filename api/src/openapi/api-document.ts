import type { OpenApiDocument } from './document-types.js';
import { documentOf, type DocumentPlace } from './document.js';
import { docsPage } from './docs/page.js';
import { allOperations } from './operations/all-operations.js';

/** The document of the api and its page, each made when it is first asked for. */
export class ApiDocument {
  private document: Promise<OpenApiDocument> | undefined;
  private page: Promise<string> | undefined;

  constructor(private readonly place: DocumentPlace) {}

  asJson(): Promise<OpenApiDocument> {
    return (this.document ??= allOperations().then((operations) => documentOf(operations, this.place)));
  }

  asPage(): Promise<string> {
    return (this.page ??= this.asJson().then(docsPage));
  }
}
