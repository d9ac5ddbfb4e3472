import { car, carFile, keepWorking, keptWorking } from '../examples/car-examples.js';
import { contract, pageOf, paging, paper, pdf, type Operation } from '../operation.js';

const kept = { tag: 'Workings', who: 'cars.read' } as const;

export const carOperations: readonly Operation[] = [
  {
    ...{ method: 'get', path: '/cars', tag: 'Cars', who: 'cars.read', query: paging },
    summary: 'The cars, by their code. A car owner sees their own.',
    answers: { 200: { description: 'A page of cars.', content: pageOf('CarSummary', car) } },
  },
  {
    ...{
      method: 'get',
      path: '/cars/{id}',
      tag: 'Cars',
      who: 'cars.read',
      summary: 'A car with its sheets.',
    },
    answers: { 200: { description: 'The car’s file.', content: contract('CarFile', carFile) } },
  },
  {
    ...kept,
    ...{ method: 'get', path: '/cars/{carId}/workings', query: paging },
    summary: 'The workings kept with a car, the newest first.',
    answers: {
      200: { description: 'A page of kept workings.', content: pageOf('KeptWorking', keptWorking) },
    },
  },
  {
    ...{ method: 'post', path: '/cars/{carId}/workings', tag: 'Workings', who: 'workings.keep' },
    summary: 'Keep a working with a car. It stays as it is kept.',
    description:
      '`typed` has a text for each field that was filled in, and in `of`, where it was begun from something, a line of at most 120 characters that says what; a case that cannot be worked out is not kept.',
    body: contract('KeepWorkingRequest', keepWorking),
    answers: { 201: { description: 'The kept working.', content: contract('KeptWorking', keptWorking) } },
  },
  {
    ...kept,
    ...{ method: 'get', path: '/cars/{carId}/workings/{id}', summary: 'One kept working.' },
    answers: { 200: { description: 'The kept working.', content: contract('KeptWorking', keptWorking) } },
  },
  {
    ...kept,
    ...{ method: 'get', path: '/cars/{carId}/workings/{id}/pdf', query: [paper] },
    summary: 'A kept working on paper, worked out again from what was typed.',
    answers: { 200: { description: 'The pages.', content: pdf } },
    refusals: { 422: 'The working asks otherwise since this case was kept.' },
  },
  {
    ...{ method: 'get', path: '/workings/{key}/pdf', tag: 'Workings', who: 'calculate', query: [paper] },
    summary: 'A working without a sheet, on paper, in the name of who asks.',
    freeQuery: {
      description:
        'What was typed: a text for each field of the working, by its name; in `of` what it was begun from, a line of at most 120 characters.',
      example: { figure: '27 lbf·ft', of: 'AT18, edition 2: head nuts' },
    },
    answers: { 200: { description: 'The pages.', content: pdf } },
  },
];
