import { nameOfRef, type JsonSchema } from '../../platform/schemas/json-schema.js';
import { html, nothing, prose, type Html } from './html.js';

export const schemaAnchor = (name: string): string => `type-${name}`;

/** What a value of a schema is, in a few words: types of their own lead to where they are described. */
export function typeWords(schema: JsonSchema): Html {
  if (schema.$ref !== undefined) {
    const name = nameOfRef(schema.$ref);
    return html`<a href="#${schemaAnchor(name)}">${name}</a>`;
  }
  if (schema.anyOf) return joined(schema.anyOf.map(typeWords), ' or ');
  if (schema.const !== undefined) return html`<code>${JSON.stringify(schema.const)}</code>`;
  if (schema.enum)
    return joined(
      schema.enum.map((value) => html`<code>${JSON.stringify(value)}</code>`),
      ', ',
    );
  if (schema.prefixItems) return html`list of ${joined(schema.prefixItems.map(typeWords), ', ')}`;
  if (schema.items) return html`list of ${typeWords(schema.items)}`;
  if (typeof schema.additionalProperties === 'object') {
    return html`by name, each ${typeWords(schema.additionalProperties)}`;
  }
  if (schema.properties)
    return html`{ ${joined(Object.entries(schema.properties).map(inner(schema)), ', ')} }`;
  return html`${[schema.type ?? 'anything'].flat().join(' or ')}${schema.contentMediaType ? ` (${schema.contentMediaType})` : ''}`;
}

const inner =
  ({ required = [] }: JsonSchema) =>
  ([name, schema]: [string, JsonSchema]): Html =>
    html`<code>${name}${required.includes(name) ? '' : '?'}</code> ${typeWords(schema)}`;

function joined(pieces: readonly Html[], between: string): Html {
  return html`${pieces.flatMap((piece, index) => (index === 0 ? [piece] : [html`${between}`, piece]))}`;
}

/** A schema as a table of its fields; what is no object is said in words. */
export function schemaTable(schema: JsonSchema): Html {
  const fields = Object.entries(schema.properties ?? {});
  if (fields.length === 0) return html`<p>${typeWords(schema)}</p>`;
  const rows = fields.map(
    ([name, field]) =>
      html`<tr>
        <td>
          <code>${name}</code
          >${schema.required?.includes(name) ? html` <span class="must">needed</span>` : nothing}
        </td>
        <td>${typeWords(field)}</td>
        <td>${field.description === undefined ? nothing : prose(field.description)}</td>
      </tr>`,
  );
  return html`<table>
    <thead>
      <tr>
        <th>Field</th>
        <th>What it is</th>
        <th>Meaning</th>
      </tr>
    </thead>
    <tbody>
      ${rows}
    </tbody>
  </table>`;
}
