import type { ShopScope } from '../platform/database/database.js';
import type { Paging } from '../platform/validation/paging.js';
import { SpecEditionEntity, type EditionRow, type WholeEditionRow } from './spec-edition.entity.js';
import { SpecEntity } from './spec.entity.js';

const columns = `
  edition.id, edition.spec_id AS "specId", edition.edition, edition.state,
  edition.value_count AS "valueCount", approver.name AS "approverName",
  edition.approved_at AS "approvedAt", edition.rests_on AS "restsOn", edition.hash`;

const whole = `
  SELECT ${columns}, spec.code, spec.title, edition.document
  FROM spec_editions edition
  JOIN specs spec ON spec.id = edition.spec_id
  LEFT JOIN people approver ON approver.id = edition.approved_by
  WHERE edition.shop_id = $1`;

/** The spec book of one shop. */
export class SpecsRepository {
  constructor(private readonly scope: ShopScope) {}

  /** One row more than the page holds, by code. */
  async list({ after, limit }: Paging): Promise<SpecEntity[]> {
    const query = this.scope.manager
      .createQueryBuilder(SpecEntity, 'spec')
      .where('spec.shop_id = :shopId', { shopId: this.scope.shopId })
      .orderBy('spec.code')
      .limit(limit + 1);
    if (after) query.andWhere('spec.code > :code', { code: after[0] });
    return query.getMany();
  }

  /** All editions of some specs, newest first, without their documents. */
  async editionsOf(specIds: readonly string[]): Promise<EditionRow[]> {
    return this.scope.manager.query(
      `SELECT ${columns}
       FROM spec_editions edition
       LEFT JOIN people approver ON approver.id = edition.approved_by
       WHERE edition.shop_id = $1 AND edition.spec_id = ANY ($2)
       ORDER BY edition.edition DESC`,
      [this.scope.shopId, specIds],
    );
  }

  async edition(specId: string, number: number): Promise<WholeEditionRow | null> {
    const rows: WholeEditionRow[] = await this.scope.manager.query(
      `${whole} AND edition.spec_id = $2 AND edition.edition = $3`,
      [this.scope.shopId, specId, number],
    );
    return rows[0] ?? null;
  }

  async editionById(id: string): Promise<WholeEditionRow | null> {
    const values = [this.scope.shopId, id];
    const rows: WholeEditionRow[] = await this.scope.manager.query(`${whole} AND edition.id = $2`, values);
    return rows[0] ?? null;
  }

  async findByCode(code: string): Promise<SpecEntity | null> {
    return this.scope.manager.findOneBy(SpecEntity, { code, shopId: this.scope.shopId });
  }

  async insert(spec: Omit<SpecEntity, 'shopId'>): Promise<void> {
    await this.scope.manager.insert(SpecEntity, { ...spec, shopId: this.scope.shopId });
  }

  /** Marks the approved edition as superseded, if there is one. */
  async supersede(specId: string): Promise<void> {
    const { shopId, manager } = this.scope;
    await manager.update(SpecEditionEntity, { shopId, specId, state: 'approved' }, { state: 'superseded' });
  }

  /** The number of the newest edition; 0 when there is none. */
  async highestEdition(specId: string): Promise<number> {
    const { shopId, manager } = this.scope;
    return (await manager.maximum(SpecEditionEntity, 'edition', { shopId, specId })) ?? 0;
  }

  async insertEdition(edition: Omit<SpecEditionEntity, 'shopId'>): Promise<void> {
    // A document is written whole; the deep partial type of an insert has no use for its unions.
    const { document, ...rest } = edition;
    await this.scope.manager.insert(SpecEditionEntity, {
      ...rest,
      document: document as object,
      shopId: this.scope.shopId,
    });
  }
}
