import type { CarFile, CarSummary } from '@second-spanner/shared/contracts/car-files';
import type { KeptWorking, KeepWorkingRequest } from '@second-spanner/shared/contracts/kept-workings';
import { sheetSummary } from './sheet-examples.js';
import { carId, time } from './usual.js';

export const car: CarSummary = {
  ...{ id: carId, code: 'LM-C01', name: 'Aldwyn Tern 1.8', year: 1961 },
  ...{ engineCode: 'AT18', engineNumber: 'AT18-20614', ownerName: 'Ravi Lindqvist', sheetCount: 1 },
};

export const carFile: CarFile = {
  ...car,
  ...{ chassisNumber: 'T61-04471', registration: 'TERN 61', colour: 'Estuary green over cream' },
  ...{ notes: 'Came in with low oil pressure.', sheets: [sheetSummary] },
};

export const keepWorking: KeepWorkingRequest = {
  ...{ working: 'convert', title: 'Main caps, from the American sheet' },
  typed: { of: 'AT18, edition 2: main caps', figure: '27 lbf·ft' },
};

export const keptWorking: KeptWorking = {
  ...keepWorking,
  ...{ id: '6a2c7f88-1b3d-4e5f-8a9b-6c7d8e9f0a1b', carId, keptBy: 'Tomasz Brandt', keptAt: time },
};
