import { randomUUID } from 'node:crypto';
import type { Page } from '@second-spanner/shared/contracts/paging';
import type { SpecDocument, SpecEdition, SpecSummary } from '@second-spanner/shared/contracts/spec';
import { checkSpecDocument } from '@second-spanner/shared/spec/check-document';
import { countValues } from '@second-spanner/shared/spec/spec-rows';
import type { Database, ShopScope } from '../platform/database/database.js';
import { notFound } from '../platform/errors/http-problem.js';
import { canonicalHash } from '../platform/hashing/canonical.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import { pageOf, type Paging } from '../platform/validation/paging.js';
import { toSpecEdition, toSpecSummary } from './spec.mapper.js';
import { SpecsRepository } from './specs.repository.js';

export interface NewEdition {
  /** Checked to be a `SpecDocument`. */
  readonly document: unknown;
  /** What its values rest on, in a line. */
  readonly restsOn: string;
  /** Who approves it, and when; null leaves it a draft. */
  readonly approval: { readonly by: string; readonly at: Date } | null;
}

/** The spec book. */
export class SpecsService {
  constructor(private readonly database: Database) {}

  async list({ shop }: SignedIn, paging: Paging): Promise<Page<SpecSummary>> {
    return this.database.readShop(shop.id, async (scope) => {
      const specs = new SpecsRepository(scope);
      const rows = await specs.list(paging);
      const editions = await specs.editionsOf(rows.map(({ id }) => id));
      return pageOf(
        rows,
        paging,
        ({ code }) => [code],
        (spec) => toSpecSummary(spec, editions),
      );
    });
  }

  async edition({ shop }: SignedIn, specId: string, number: number): Promise<SpecEdition> {
    const found = await this.database.readShop(shop.id, (scope) =>
      new SpecsRepository(scope).edition(specId, number),
    );
    if (!found) throw notFound('edition');
    return toSpecEdition(found);
  }

  /** One edition by its own id, within somebody else's work on the database. */
  async editionIn(scope: ShopScope, id: string): Promise<SpecEdition | null> {
    const found = await new SpecsRepository(scope).editionById(id);
    return found && toSpecEdition(found);
  }

  /**
   * Puts the next edition of a spec into the book. An approved one takes the place of the one before it.
   * Throws `InputError` for a document that is not a spec. Answers the edition's id.
   */
  async add(shopId: string, { document: input, restsOn, approval }: NewEdition): Promise<string> {
    const document = checkSpecDocument(input);
    const id = randomUUID();
    await this.database.withShop(shopId, async (scope) => {
      const specs = new SpecsRepository(scope);
      const specId = await specOf(specs, document);
      if (approval) await specs.supersede(specId);
      await specs.insertEdition({
        ...{ id, specId, document, restsOn },
        edition: (await specs.highestEdition(specId)) + 1,
        state: approval ? 'approved' : 'draft',
        approvedBy: approval?.by ?? null,
        approvedAt: approval?.at ?? null,
        hash: canonicalHash(document),
        valueCount: countValues(document),
      });
    });
    return id;
  }
}

async function specOf(specs: SpecsRepository, { code, title }: SpecDocument): Promise<string> {
  const known = await specs.findByCode(code);
  if (known) return known.id;
  const id = randomUUID();
  await specs.insert({ id, code, title });
  return id;
}
