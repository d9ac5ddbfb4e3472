import { sheetStates, type NewSheetRequest } from '@second-spanner/shared/contracts/sheets';
import { imogen, tomasz } from '../examples/people-examples.js';
import { historyLine, sheet, sheetSummary, snag, step } from '../examples/sheet-examples.js';
import { carId, editionId } from '../examples/usual.js';
import {
  contract,
  listOf,
  pageOf,
  paging,
  paper,
  pdf,
  type Operation,
  type Parameter,
} from '../operation.js';

const newSheet: NewSheetRequest = {
  ...{ carId, specEditionId: editionId, builderId: tomasz.id, countersignerId: imogen.id },
};
const whole = contract('Sheet', sheet);
const filter: readonly Parameter[] = [
  {
    ...{ name: 'state', description: 'Only sheets in this state.', example: 'on-the-stand' },
    schema: { type: 'string', enum: sheetStates },
  },
  {
    name: 'car',
    description: 'Only sheets of this car, by its id.',
    schema: { type: 'string' },
    example: carId,
  },
];
const refused = 'The rules of the sheet refuse it; the problem says which hold or step.';
const about = { tag: 'Sheets', who: 'sheets.read' } as const;

export const sheetOperations: readonly Operation[] = [
  {
    ...about,
    ...{ method: 'get', path: '/sheets', query: [...filter, ...paging] },
    summary: 'The sheets, the newest change first. A car owner sees those of their cars.',
    answers: { 200: { description: 'A page of sheets.', content: pageOf('SheetSummary', sheetSummary) } },
  },
  {
    ...{ method: 'post', path: '/sheets', tag: 'Sheets', who: 'sheets.start' },
    summary: 'Lay out a new sheet from an approved edition of a spec.',
    body: contract('NewSheetRequest', newSheet),
    answers: { 201: { description: 'The sheet, planned.', content: whole } },
    refusals: { 409: 'Something happened meanwhile.', 422: refused },
  },
  {
    ...about,
    ...{ method: 'get', path: '/sheets/{id}', summary: 'A sheet with all its steps in short.' },
    headers: [
      {
        ...{ name: 'If-None-Match', description: 'The ETag of the sheet as it is known.' },
        ...{ schema: { type: 'string' }, example: '"31-0c8a1b52-builder"' },
      },
    ],
    answers: {
      200: {
        description: 'The sheet.',
        content: whole,
        headers: { ETag: 'Changes with the sheet and its reader.' },
      },
      304: { description: 'It is still as it is known.' },
    },
  },
  {
    ...{ method: 'post', path: '/sheets/{id}/start', tag: 'Sheets', who: 'sheets.start' },
    summary: 'Put a planned sheet on the stand.',
    answers: { 200: { description: 'The sheet, on the stand.', content: whole } },
    refusals: { 409: 'Something happened meanwhile.', 422: refused },
  },
  {
    ...about,
    ...{ method: 'get', path: '/sheets/{id}/snags', summary: 'The snags of a sheet.' },
    answers: { 200: { description: 'Every snag, settled or open.', content: listOf('SnagView', snag) } },
  },
  {
    ...about,
    ...{ method: 'get', path: '/sheets/{id}/history', query: paging },
    summary: 'What happened on a sheet, from its ledger, the newest first.',
    answers: { 200: { description: 'A page of lines.', content: pageOf('HistoryLine', historyLine) } },
  },
  {
    ...{
      method: 'post',
      path: '/sheets/{id}/snags/{snagId}/settlements',
      tag: 'Sheets',
      who: 'snags.settle',
    },
    summary: 'Settle a snag. Accepting a fault as it is takes a foreman.',
    body: contract('SettleSnagRequest', { how: 'redone', reason: 'Shell fitted anew.' }),
    answers: { 200: { description: 'The step as it then stands.', content: contract('StepDetail', step) } },
    refusals: { 409: 'It is settled already.', 422: refused },
  },
  {
    ...{ method: 'post', path: '/sheets/{id}/signatures', tag: 'Sheets', who: 'signed-in' },
    summary: 'Sign a sheet as built, countersigned or released. Asks for the password again.',
    body: contract('SignRequest', { meaning: 'built', password: 'parallel-spanners-61' }),
    answers: { 200: { description: 'The sheet with its signature.', content: whole } },
    refusals: {
      403: 'This signature is not for this person.',
      409: 'Something happened meanwhile.',
      422: refused,
    },
  },
  {
    ...{ method: 'post', path: '/sheets/{id}/send-back', tag: 'Sheets', who: 'sheets.send-back' },
    summary: 'Send a signed sheet back to the stand.',
    body: contract('SendBackRequest', { reason: 'Step 3.2 has no photo of the marks.' }),
    answers: { 200: { description: 'The sheet, on the stand again.', content: whole } },
    refusals: { 409: 'Something happened meanwhile.', 422: refused },
  },
  {
    ...about,
    ...{ method: 'get', path: '/sheets/{id}/events', summary: 'Be told when something on a sheet changes.' },
    description: 'A stream of server-sent events `changed`, each with a SheetChanged as its data.',
    answers: {
      200: {
        description: 'The stream.',
        content: {
          ...{ media: 'text/event-stream', schema: { type: 'string' } },
          example:
            'event: changed\ndata: {"sheetId":"40ce5f96-b14d-4acc-8ea0-4d5e6f708192","version":32}\n\n',
        },
      },
    },
  },
  {
    ...{ method: 'get', path: '/sheets/{id}/build-sheet.pdf', tag: 'Sheets', who: 'build-sheets.read' },
    ...{ summary: 'A sheet on paper, as the person who asks may see it.', query: [paper] },
    answers: { 200: { description: 'The pages.', content: pdf } },
  },
];
