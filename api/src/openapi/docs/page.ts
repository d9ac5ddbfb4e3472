import type { OpenApiDocument, OperationObject } from '../document-types.js';
import { html, Html, nothing, prose } from './html.js';
import { operationEntry } from './operation-entry.js';
import { schemaAnchor, schemaTable } from './schema-table.js';
import { style } from './style.js';

interface Route {
  readonly method: string;
  readonly path: string;
  readonly operation: OperationObject;
}

/** The document as a page for people: no script, every entry with an address of its own. */
export function docsPage(document: OpenApiDocument): string {
  const routes = Object.entries(document.paths).flatMap(([path, item]) =>
    Object.entries(item).map(([method, operation]): Route => ({ method, path, operation })),
  );
  const groups = document.tags.map(({ name }) => ({
    name,
    routes: routes.filter(({ operation }) => operation.tags.includes(name)),
  }));
  const page = html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width" />
        <title>Second Spanner: the api</title>
        ${new Html(`<style>${style}</style>`)}
      </head>
      <body>
        <div class="frame">
          <header>
            <div>
              <span class="cap">Second Spanner</span>
              <h1>The api</h1>
            </div>
            <div>
              <span class="cap">For machines</span><a href="openapi.json">OpenAPI ${document.openapi}</a>
            </div>
          </header>
          <main>
            <div class="about">${prose(document.info.description)}</div>
            ${contents(groups)}${groups.map(groupSection)}${types(document)}
          </main>
        </div>
      </body>
    </html>`;
  return page.text;
}

interface Group {
  readonly name: string;
  readonly routes: readonly Route[];
}

const groupAnchor = (name: string): string => `group-${name.toLowerCase().replaceAll(' ', '-')}`;

function contents(groups: readonly Group[]): Html {
  const lists = groups.map(({ name, routes }) => {
    const entries = routes.map(
      ({ method, path, operation }) =>
        html`<li>
          <a href="#${operation.operationId}"
            ><span class="fig"><span class="method">${method}</span> ${path}</span></a
          >
        </li>`,
    );
    return html`<details>
      <summary>${name}, ${routes.length}</summary>
      <ul>
        <li><a href="#${groupAnchor(name)}">All of them</a></li>
        ${entries}
      </ul>
    </details>`;
  });
  return html`<nav aria-label="Routes">
    <h2>Routes</h2>
    ${lists}
    <p><a href="#types">Types</a></p>
  </nav>`;
}

function groupSection({ name, routes }: Group): Html {
  const entries = routes.map(({ method, path, operation }) => operationEntry(method, path, operation));
  return html`<section id="${groupAnchor(name)}">
    <h2>${name}</h2>
    ${entries}
  </section>`;
}

function types({ components }: OpenApiDocument): Html {
  const entries = Object.entries(components.schemas).map(
    ([name, schema]) =>
      html`<article id="${schemaAnchor(name)}">
        <h3 class="fig">${name}</h3>
        ${schema.description === undefined ? nothing : prose(schema.description)}${schemaTable(schema)}
      </article>`,
  );
  return html`<section id="types">
    <h2>Types</h2>
    ${entries}
  </section>`;
}
