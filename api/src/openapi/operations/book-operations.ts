import { spec, tool } from '../examples/book-examples.js';
import { bench, storedFile, verification } from '../examples/sheet-examples.js';
import { refTo } from '../../platform/schemas/json-schema.js';
import { contract, listOf, pageOf, paging, type Operation } from '../operation.js';

const photo = { schema: { type: 'string', contentMediaType: 'image/jpeg' }, media: 'image/jpeg' };

export const bookOperations: readonly Operation[] = [
  {
    ...{ method: 'get', path: '/specs', tag: 'Specs', who: 'specs.read', query: paging },
    summary: 'The spec book, by code.',
    answers: {
      200: { description: 'A page of specs with their editions.', content: pageOf('SpecSummary', spec) },
    },
  },
  {
    ...{ method: 'get', path: '/specs/{id}/editions/{number}', tag: 'Specs', who: 'specs.read' },
    summary: 'One edition of a spec, whole: every value with its unit and its source.',
    answers: { 200: { description: 'The edition.', content: { schema: refTo('SpecEdition') } } },
  },
  {
    ...{ method: 'get', path: '/tools', tag: 'Tools', who: 'tools.read' },
    summary: 'The register of measuring tools, by code.',
    answers: { 200: { description: 'Every tool.', content: listOf('Tool', tool) } },
  },
  {
    ...{ method: 'get', path: '/bench', tag: 'Bench', who: 'sheets.read' },
    summary: 'What waits for the person who asks, the most pressing first.',
    answers: { 200: { description: 'The bench.', content: contract('Bench', bench) } },
  },
  {
    ...{ method: 'post', path: '/files', tag: 'Photos', who: 'files.write', summary: 'Store a photo.' },
    description:
      'It is read and made anew: what a camera writes beside the picture does not stay. At most 12 MB.',
    body: {
      media: 'multipart/form-data',
      schema: {
        ...{ type: 'object', required: ['file'], additionalProperties: false },
        properties: { file: { type: 'string', contentMediaType: 'application/octet-stream' } },
      },
    },
    answers: {
      201: { description: 'The photo as it is stored.', content: contract('StoredFile', storedFile) },
    },
  },
  {
    ...{ method: 'get', path: '/files/{id}', tag: 'Photos', who: 'files.read', summary: 'A stored photo.' },
    answers: { 200: { description: 'The picture.', content: photo } },
  },
  {
    ...{ method: 'get', path: '/verifications/{code}', tag: 'Verification', who: 'anyone' },
    summary: 'Whether a printed sheet is the one that was signed.',
    description:
      'Needs no sign-in. The record is hashed again, and every signature checked, when it is asked.',
    answers: { 200: { description: 'What was released.', content: contract('Verification', verification) } },
  },
];
