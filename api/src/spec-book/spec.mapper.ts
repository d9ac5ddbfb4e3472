import type { EditionSummary, SpecEdition, SpecSummary } from '@second-spanner/shared/contracts/spec';
import type { EditionRow, WholeEditionRow } from './spec-edition.entity.js';
import type { SpecEntity } from './spec.entity.js';

export function toEditionSummary(row: EditionRow): EditionSummary {
  const { id, edition, state, valueCount, approverName, approvedAt, restsOn, hash } = row;
  return {
    ...{ id, edition, state, valueCount, restsOn, hash },
    approvedBy: approverName,
    approvedAt: approvedAt?.toISOString() ?? null,
  };
}

export function toSpecSummary({ id, code, title }: SpecEntity, editions: readonly EditionRow[]): SpecSummary {
  const own = editions.filter(({ specId }) => specId === id);
  return { id, code, title, editions: own.map(toEditionSummary) };
}

export function toSpecEdition(row: WholeEditionRow): SpecEdition {
  const { specId, code, title, document } = row;
  return { ...toEditionSummary(row), specId, code, title, document };
}
