import type {
  Bench,
  CallAnswer,
  EntryView,
  HistoryLine,
  Sheet,
  SheetSummary,
  SnagView,
  StepDetail,
  StepLine,
  StoredFile,
  Verification,
} from '@second-spanner/shared/contracts/sheets';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { imogen, tomasz } from './people-examples.js';
import { carId, editionId, hash, sheetId, specId, time, toolId } from './usual.js';

export const sheetSummary: SheetSummary = {
  ...{ id: sheetId, code: 'LM-0147', state: 'on-the-stand', carId, carName: 'Aldwyn Tern 1.8' },
  ...{ engineCode: 'AT18', specEdition: 2, builder: tomasz, countersigner: imogen },
  ...{ stepsDone: 12, stepsTotal: 55, openSnags: 0, changedAt: time },
};

const id = '8403a3da-f581-4ee0-82e4-8192a3b4c5d6';
const fresh = { done: 1, of: 2, openSnags: 0 } as const;

export const reading: EntryContent = {
  ...{ kind: 'measurement', at: 'Main 1', value: { value: 0.045, unit: 'mm' }, toolId },
};

const entry: EntryView = {
  ...{ id, content: reading, verdict: 'pass', by: tomasz, at: time, round: 1, current: true },
  reason: '0.045 mm is between 0.025 and 0.065 mm.',
  ...{ replaces: null, replacedBy: null, replaceReason: null },
};

const line: StepLine = {
  ...{ code: '1.2', stage: 1, kind: 'measurement', title: 'Main clearance', status: 'in-hand' },
  ...{ hold: false, critical: true, secondCheck: 'measured-again', ...fresh },
};

export const step: StepDetail = {
  ...line,
  ...{ sheetId, version: 31, round: 1, waitsFor: [], covered: false, entries: [entry] },
  definition: {
    ...{ code: '1.2', stage: 1, kind: 'measurement', title: 'Main clearance', instruction: 'Read it.' },
    ...{ critical: true, hold: false, restsOn: ['1.1'], secondCheck: 'measured-again' },
    ...{ method: 'bore-gauge', unit: 'mm', at: ['Main 1', 'Main 2'] },
    limits: { low: { value: 0.025, unit: 'mm' }, high: { value: 0.065, unit: 'mm' } },
  },
  ...{ secondReadings: [], countersignatures: [], snags: [], calls: [], uncriticalReason: null },
  can: {
    ...{ record: true, readAgain: false, countersign: false },
    ...{ raiseSnag: true, unmarkCritical: false, call: false },
  },
};

export const callAnswer: CallAnswer = { ...step, mailed: true };

export const sheet: Sheet = {
  ...sheetSummary,
  ...{ engineNumber: 'AT18-20614', ownerName: 'Ravi Lindqvist', specId, specTitle: 'Aldwyn Tern 1.8' },
  ...{ specEditionId: editionId, version: 31, signatures: [], contentHash: null, verificationCode: null },
  stages: [{ stage: 1, title: 'Crankshaft', hold: true, cautions: [], steps: [line] }],
  ...{ canSign: null, nextStep: '1.2' },
};

export const snag: SnagView = {
  ...{ id, stepCode: '1.2', cause: 'raised', words: 'The shell rocks in its cap.', by: imogen, at: time },
  ...{ settled: null, maySettle: true },
};

export const historyLine: HistoryLine = {
  ...{ seq: 18, at: time, by: tomasz, stepCode: '1.2', verdict: 'pass' },
  sentence: 'Main 1: 0.045 mm, with T-02.',
};

export const bench: Bench = {
  items: [
    {
      ...{ kind: 'next-step', sheetId, sheetCode: 'LM-0147', stepCode: '1.2', stepKind: 'measurement' },
      ...{ carName: 'Aldwyn Tern 1.8', title: 'Main clearance', sentence: 'Goes on here.', since: time },
    },
  ],
  onTheStand: [sheetSummary],
};

export const storedFile: StoredFile = { id, width: 1600, height: 1200 };

export const verification: Verification = {
  ...{ sheetCode: 'LM-0147', verificationCode: '7K3F-Q9TD', carName: 'Aldwyn Tern 1.8' },
  ...{ engineNumber: 'AT18-20614', specTitle: 'Aldwyn Tern 1.8', specEdition: 2, releasedAt: time },
  ...{ contentHash: hash, signatures: [{ meaning: 'built', name: 'Tomasz Brandt', at: time }] },
  ...{ verdict: 'pass', reason: 'The record was hashed again just now: it is the one that was released.' },
};
