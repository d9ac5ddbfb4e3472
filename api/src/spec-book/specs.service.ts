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
import { restsOn } from './rests-on.js';
import { toSpecEdition, toSpecSummary } from './spec.mapper.js';
import { SpecsRepository } from './specs.repository.js';

/** Who approves an edition, and when. */
export interface Approval {
  readonly by: string;
  readonly at: Date;
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
   * Puts an approved edition into the book, the next of its spec; the one before it is superseded.
   * Throws `InputError` for a document that is not a spec. Answers the edition's id.
   */
  async addApproved(shopId: string, input: unknown, { by, at }: Approval): Promise<string> {
    const document = checkSpecDocument(input);
    const id = randomUUID();
    await this.database.withShop(shopId, async (scope) => {
      const specs = new SpecsRepository(scope);
      const specId = await specOf(specs, document);
      await specs.insertEdition({
        ...{ id, specId, document, state: 'approved', approvedBy: by, approvedAt: at },
        edition: (await specs.supersede(specId)) + 1,
        hash: canonicalHash(document),
        valueCount: countValues(document),
        restsOn: restsOn(document),
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
