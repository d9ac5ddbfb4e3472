import type { MediaType, OperationObject, ParameterObject } from '../document-types.js';
import { html, nothing, prose, type Html } from './html.js';
import { typeWords } from './schema-table.js';

/** One route: who may, how it is asked, what it answers. */
export function operationEntry(method: string, path: string, operation: OperationObject): Html {
  const { operationId, summary, description, parameters = [], requestBody, responses } = operation;
  return html`<article id="${operationId}">
    <h3><span class="fig method">${method}</span> <span class="fig">/api${path}</span></h3>
    <p>${summary}</p>
    ${prose(description)}${parametersTable(parameters)}${
      requestBody
        ? html`<h4>Request</h4>
            ${contents(requestBody.content)}`
        : nothing
    }
    <h4>Answers</h4>
    ${answersTable(responses)}${examples(responses)}
  </article>`;
}

function parametersTable(parameters: readonly ParameterObject[]): Html {
  if (parameters.length === 0) return nothing;
  const rows = parameters.map(
    ({ name, in: place, description, required, schema, example }) =>
      html`<tr>
        <td><code>${name}</code>${required ? html` <span class="must">needed</span>` : nothing}</td>
        <td>${place}, ${typeWords(schema)}</td>
        <td>
          ${prose(description)}<code>${typeof example === 'string' ? example : JSON.stringify(example)}</code>
        </td>
      </tr>`,
  );
  return html`<h4>Parameters</h4>
    <table>
      <thead>
        <tr>
          <th>Name</th>
          <th>What it is</th>
          <th>Meaning, example</th>
        </tr>
      </thead>
      <tbody>
        ${rows}
      </tbody>
    </table>`;
}

function contents(content: Readonly<Record<string, MediaType>>): Html {
  const parts = Object.entries(content).map(
    ([media, { schema, example }]) =>
      html`<p>${typeWords(schema)}, <code>${media}</code></p>
        ${exampleOf(example)}`,
  );
  return html`${parts}`;
}

function answersTable(responses: OperationObject['responses']): Html {
  const rows = Object.entries(responses).map(([status, { description, content = {}, headers = {} }]) => {
    const types = Object.entries(content).map(
      ([media, { schema }]) => html`${typeWords(schema)}, <code>${media}</code>`,
    );
    const sent = Object.entries(headers).map(
      ([name, header]) => html`<p><code>${name}</code>: ${header.description}</p>`,
    );
    return html`<tr>
      <td class="fig">${status}</td>
      <td>${types}</td>
      <td>${prose(description)}${sent}</td>
    </tr>`;
  });
  return html`<table>
    <thead>
      <tr>
        <th>Status</th>
        <th>Content</th>
        <th>Meaning</th>
      </tr>
    </thead>
    <tbody>
      ${rows}
    </tbody>
  </table>`;
}

/** Examples of what succeeds: those of refusals are alike everywhere. */
function examples(responses: OperationObject['responses']): Html {
  const shown = Object.entries(responses)
    .filter(([status]) => status.startsWith('2'))
    .flatMap(([status, { content = {} }]) =>
      Object.values(content).map(({ example }) => ({ status, example })),
    )
    .filter(({ example }) => example !== undefined)
    .map(
      ({ status, example }) =>
        html`<details>
          <summary>Example of ${status}</summary>
          ${exampleOf(example)}
        </details>`,
    );
  return html`${shown}`;
}

function exampleOf(example: unknown): Html {
  if (example === undefined) return nothing;
  return html`<pre>${typeof example === 'string' ? example : JSON.stringify(example, null, 2)}</pre>`;
}
