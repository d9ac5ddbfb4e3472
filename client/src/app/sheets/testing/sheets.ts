import type { Sheet } from '@second-spanner/shared/contracts/sheets';

/** A sheet on the stand, without stages. */
export function sheetOf(over: Partial<Sheet> = {}): Sheet {
  return {
    id: 'sheet',
    code: 'LM-0147',
    state: 'on-the-stand',
    carId: 'car',
    carName: 'Aldwyn Tern 1.8',
    engineCode: 'AT18',
    engineNumber: 'AT18-20417',
    ownerName: null,
    specId: 'spec',
    specTitle: 'AT18',
    specEdition: 2,
    specEditionId: 'edition',
    builder: { id: 'builder', name: 'Tomasz Brandt', role: 'builder' },
    countersigner: { id: 'second', name: 'Imogen Vale', role: 'countersigner' },
    stepsDone: 0,
    stepsTotal: 0,
    openSnags: 0,
    changedAt: '2026-03-02T10:00:00Z',
    version: 1,
    stages: [],
    signatures: [],
    contentHash: null,
    verificationCode: null,
    canSign: null,
    nextStep: null,
    ...over,
  };
}
