import { readFileSync } from 'node:fs';
import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { EntryView, Sheet, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent, StepDefinition } from '@second-spanner/shared/contracts/steps';
import type { PersonName } from '@second-spanner/shared/contracts/people';
import { capMap } from '@second-spanner/shared/ignition/cap-map';
import { checkSpecDocument } from '@second-spanner/shared/spec/check-document';
import { planOf } from '@second-spanner/shared/sheet/plan-of';
import { proposeSheet } from '@second-spanner/shared/sheet/proposal/propose-sheet';
import { slotsOf } from '@second-spanner/shared/sheet/slots';
import type { Paper } from '../../paper/paper-size.js';
import type { BuildSheet } from '../build-sheet.js';

const tomasz: PersonName = { id: 'tomasz', name: 'Tomasz Brandt', role: 'builder' };
const imogen: PersonName = { id: 'imogen', name: 'Imogen Vale', role: 'countersigner' };
const nell: PersonName = { id: 'nell', name: 'Nell Okafor', role: 'foreman' };
const at = '2026-12-01T14:06:00.000Z';

const tool: Tool = {
  id: 'tool',
  code: 'T-07',
  name: 'Digital wrench',
  kind: 'digital-wrench',
  low: { value: 0, unit: 'N·m' },
  high: { value: 200, unit: 'N·m' },
  resolution: { value: 0.1, unit: 'N·m' },
  uncertaintyShare: 0.02,
  calibrationDue: '2027-03-14',
};

/** A sheet of the four, every step recorded in the middle of its limits and countersigned, in the given state. */
export function sampleBuildSheet(state: 'released' | 'on-the-stand', paper: Paper = 'a4'): BuildSheet {
  const spec = new URL('../../../../test-data/specs/ok/at18.json', import.meta.url);
  const document = checkSpecDocument(JSON.parse(readFileSync(spec, 'utf8')));
  const proposed = proposeSheet(document);
  const steps = proposed.steps.map(detailOf);
  const released = state === 'released';
  const sheet: Sheet = {
    ...{ id: 'sheet', code: 'LM-0147', state, carId: 'car', carName: 'Aldwyn Tern 1.8', engineCode: 'AT18' },
    ...{
      specEdition: 2,
      builder: tomasz,
      countersigner: imogen,
      stepsDone: steps.length,
      stepsTotal: steps.length,
    },
    ...{
      openSnags: 0,
      changedAt: at,
      engineNumber: 'AT18-20417',
      ownerName: 'Ravi Lindqvist',
      specId: 'spec',
    },
    ...{ specTitle: document.title, specEditionId: 'edition', version: 900, canSign: null, nextStep: null },
    stages: proposed.stages.map((stage) => ({
      ...stage,
      steps: steps.filter((step) => step.stage === stage.stage),
    })),
    signatures: released
      ? [tomasz, imogen, nell].map((person, index) => ({
          meaning: (['built', 'countersigned', 'released'] as const)[index] ?? 'built',
          person,
          at,
          binding: 'ab'.repeat(32),
          contentHash: 'cd'.repeat(32),
        }))
      : [],
    contentHash: released ? 'cd'.repeat(32) : null,
    verificationCode: released ? '7K3F-Q9TD' : null,
  };
  return {
    ...{ sheet, steps, paper, tools: [tool], shopName: 'Low Mill Motor Works', demo: true },
    ...{ dialect: 'british', verificationAddress: 'http://127.0.0.1:4300/v' },
  };
}

function detailOf(definition: StepDefinition): StepDetail {
  const { code, stage, kind, title, hold, critical } = definition;
  const entries = contentsOf(definition).map(entryOf);
  const count = slotsOf(definition).length;
  return {
    ...{
      code,
      stage,
      kind,
      title,
      hold,
      critical,
      definition,
      entries,
      status: 'done',
      done: count,
      of: count,
    },
    ...{
      secondCheck: definition.secondCheck ?? null,
      openSnags: 0,
      sheetId: 'sheet',
      version: 900,
      round: 1,
    },
    ...{ waitsFor: [], covered: false, secondReadings: [], snags: [], calls: [], uncriticalReason: null },
    countersignatures: critical
      ? [{ by: imogen, at, round: 1, outcome: 'agree', reason: null, pullsWitnessed: [] }]
      : [],
    can: {
      record: false,
      readAgain: false,
      countersign: false,
      raiseSnag: false,
      unmarkCritical: false,
      call: false,
    },
  };
}

const entryOf = (content: EntryContent, index: number): EntryView => ({
  ...{ id: `entry-${index}`, content, verdict: 'pass', reason: 'Well inside.', by: tomasz, at, round: 1 },
  ...{ replaces: null, replacedBy: null, replaceReason: null, current: true },
});

function contentsOf(definition: StepDefinition): readonly EntryContent[] {
  switch (definition.kind) {
    case 'check':
      return [{ kind: 'check', outcome: 'pass' }];
    case 'measurement': {
      const { low, high } = definition.limits;
      const value = low && high ? (low.value + high.value) / 2 : (high?.value ?? low?.value ?? 1);
      return definition.at.map((place) => ({
        kind: 'measurement',
        at: place,
        value: { value, unit: definition.unit },
        toolId: 'tool',
      }));
    }
    case 'tightening':
      return planOf(definition).steps.map(({ pass, fastener, target, angle }) => ({
        ...{ kind: 'tightening', pass, fastener, toolId: 'tool' },
        ...(target && { reading: target }),
        ...(angle !== undefined && { angle }),
      }));
    case 'wiring': {
      const leads = capMap(definition.cap).leads;
      return [
        { kind: 'wiring', fitted: Object.fromEntries(leads.map((lead) => [lead.outlet, lead.cylinder])) },
      ];
    }
    case 'valve-timing':
      return [{ kind: 'valve-timing', sightings: [[{ cylinder: 4, rocking: true }]] }];
    case 'photo':
      return definition.shows.map((shows) => ({ kind: 'photo', shows, fileId: 'file' }));
  }
}
