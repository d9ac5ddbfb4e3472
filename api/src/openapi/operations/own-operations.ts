import type { Operation } from '../operation.js';

export const ownOperations: readonly Operation[] = [
  {
    ...{ method: 'get', path: '/health', tag: 'About the api', who: 'anyone' },
    summary: 'Whether the api and its database answer.',
    answers: {
      200: {
        description: 'They do.',
        content: {
          schema: {
            ...{ type: 'object', required: ['status'], additionalProperties: false },
            properties: { status: { type: 'string', const: 'ok' } },
          },
          example: { status: 'ok' },
        },
      },
    },
  },
  {
    ...{ method: 'get', path: '/openapi.json', tag: 'About the api', who: 'anyone' },
    summary: 'This document, for machines.',
    answers: {
      200: {
        description: 'OpenAPI 3.1.',
        content: {
          schema: { type: 'object', required: ['openapi', 'info', 'paths'] },
          media: 'application/json',
        },
      },
    },
  },
  {
    ...{
      method: 'get',
      path: '/docs',
      tag: 'About the api',
      who: 'anyone',
      summary: 'This document, for people.',
    },
    answers: { 200: { description: 'A page.', content: { schema: { type: 'string' }, media: 'text/html' } } },
  },
];
