import { readFile } from 'node:fs/promises';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { Role } from '@second-spanner/shared/contracts/people';
import type { ProposedSheet } from '@second-spanner/shared/sheet/proposal/propose-sheet';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { Services } from '../services.js';
import { smallSteps } from './small-steps.js';
import type { Workshop } from './workshop.js';

const mm = (value: number): Quantity => ({ value, unit: 'mm' });
const newtonMetres = (value: number): Quantity => ({ value, unit: 'N·m' });

/** Codes of the tools on the test bench. */
export type ToolCode = 'T-02' | 'T-03' | 'T-07' | 'T-10' | 'T-24';

const toolsToAdd: readonly (Omit<Tool, 'id' | 'code'> & { readonly code: ToolCode })[] = [
  gauge('T-02', 'Bore gauge', '2999-12-31'),
  gauge('T-03', 'Bore gauge of the second person', '2999-12-31'),
  gauge('T-24', 'Bore gauge past its date', '2020-01-01'),
  {
    ...{
      code: 'T-07',
      name: 'Click wrench',
      kind: 'click-wrench',
      low: newtonMetres(10),
      high: newtonMetres(100),
    },
    ...{ resolution: newtonMetres(1), uncertaintyShare: 0.03, length: mm(400), calibrationDue: '2999-12-31' },
  },
  {
    ...{
      code: 'T-10',
      name: 'Digital wrench',
      kind: 'digital-wrench',
      low: newtonMetres(10),
      high: newtonMetres(200),
    },
    ...{
      resolution: newtonMetres(0.1),
      uncertaintyShare: 0.01,
      length: mm(400),
      calibrationDue: '2999-12-31',
    },
  },
];

function gauge(code: ToolCode, name: string, calibrationDue: string): (typeof toolsToAdd)[number] {
  return {
    ...{ code, name, kind: 'bore-gauge', low: mm(0), high: mm(100), resolution: mm(0.001) },
    ...{ uncertainty: mm(0.003), calibrationDue },
  };
}

export interface SmallSheet {
  readonly edition: string;
  readonly tools: Readonly<Record<ToolCode, string>>;
  /** Lays out one more sheet of the same steps and answers its id; on the stand unless it is to stay planned. */
  layOut(options?: { readonly planned?: boolean; readonly carId?: string }): Promise<string>;
}

/** An approved edition, tools, and sheets of a few steps: one of each kind, most of them critical. */
export async function smallSheets(services: Services, workshop: Workshop): Promise<SmallSheet> {
  const { shop, people, cars } = workshop;
  const path = new URL('../../../test-data/specs/ok/at18.json', import.meta.url);
  const document: unknown = JSON.parse(await readFile(path, 'utf8'));
  const approval = { by: people.nell, at: new Date() };
  const edition = await services.specs.add(shop, { document, restsOn: 'A manual', approval });
  const ids: [ToolCode, string][] = [];
  for (const tool of toolsToAdd) ids.push([tool.code, await services.tools.add(shop, tool)]);
  const proposal: ProposedSheet = {
    stages: [
      { stage: 1, title: 'Crankshaft', hold: true, cautions: ['Keep hands from under it.'] },
      { stage: 2, title: 'Ignition', hold: false, cautions: [] },
    ],
    steps: smallSteps,
  };
  const tomasz = asSignedIn(workshop, 'tomasz', 'Tomasz Brandt', 'builder');
  return {
    edition,
    tools: Object.fromEntries(ids) as Record<ToolCode, string>,
    layOut: async ({ planned = false, carId = cars.ravis } = {}) => {
      const request = {
        ...{ carId, specEditionId: edition, builderId: people.tomasz },
        countersignerId: people.imogen,
      };
      const id = await services.sheets.layOut.layOut(tomasz, request, { proposal });
      if (!planned) await services.sheets.start.start(tomasz, id);
      return id;
    },
  };
}

/** Somebody of the workshop, for a service that is called without a request. */
export function asSignedIn(
  { shop, people }: Workshop,
  key: keyof Workshop['people'],
  name: string,
  role: Role,
): SignedIn {
  return {
    sessionId: '',
    person: { id: people[key], name, email: `${key}@lowmill.example`, role, dialect: null },
    shop: { id: shop, name: 'Low Mill Motor Works', dialect: 'british', demo: true },
  };
}
