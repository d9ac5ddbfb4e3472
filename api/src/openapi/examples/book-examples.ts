import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { SpecSummary } from '@second-spanner/shared/contracts/spec';
import { editionId, hash, specId, time, toolId } from './usual.js';

export const tool: Tool = {
  ...{ id: toolId, code: 'T-07', name: 'Digital wrench', kind: 'digital-wrench' },
  low: { value: 10, unit: 'N·m' },
  high: { value: 200, unit: 'N·m' },
  resolution: { value: 0.1, unit: 'N·m' },
  ...{ uncertaintyShare: 0.02, length: { value: 400, unit: 'mm' }, calibrationDue: '2027-03-14' },
};

export const spec: SpecSummary = {
  ...{ id: specId, code: 'AT18', title: 'Aldwyn Tern 1.8' },
  editions: [
    {
      ...{ id: editionId, edition: 2, state: 'approved', valueCount: 214, hash },
      ...{ approvedBy: 'Nell Okafor', approvedAt: time, restsOn: 'workshop manual, measured parts' },
    },
  ],
};
