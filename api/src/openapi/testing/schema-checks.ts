import { Ajv2020 } from 'ajv/dist/2020.js';
import type { OpenApiDocument } from '../document-types.js';

type Check = (value: unknown) => string | null;

/** A unit may be spelt otherwise in a request than in an answer. */
const anySpelling = { type: 'string' } as const;

/** Checks values against schemas that stand in a document, by the path to them. */
export class SchemaChecks {
  private readonly answers: Ajv2020;
  private readonly requests: Ajv2020;
  private readonly checks = new Map<string, Check>();

  constructor(document: OpenApiDocument) {
    const schemas = { ...document.components.schemas, Unit: anySpelling };
    this.answers = ajvOf(document);
    this.requests = ajvOf({ ...document, components: { ...document.components, schemas } });
  }

  /** What is wrong with a value, in a sentence; null when it is right. */
  trouble(of: 'requests' | 'answers', path: readonly string[], value: unknown): string | null {
    const pointer = path.map((step) => `/${step.replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
    const ref = `document#${encodeURI(pointer)}`;
    const known = this.checks.get(of + ref);
    if (known) return known(value);
    const validate = this[of].compile({ $ref: ref });
    const check: Check = (tried) =>
      validate(tried) ? null : this[of].errorsText(validate.errors?.slice(0, 3), { dataVar: 'value' });
    this.checks.set(of + ref, check);
    return check(value);
  }
}

const ajvOf = (document: OpenApiDocument): Ajv2020 =>
  new Ajv2020({ strict: false, allErrors: true, validateFormats: false }).addSchema(document, 'document');
