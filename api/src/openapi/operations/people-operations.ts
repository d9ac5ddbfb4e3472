import type { PreferencesRequest, SignInRequest } from '@second-spanner/shared/contracts/people';
import { imogen, session, tomasz } from '../examples/people-examples.js';
import { contract, listOf, type Operation } from '../operation.js';

const signIn: SignInRequest = { email: 'tomasz@lowmill.example', password: 'parallel-spanners-61' };
const preferences: PreferencesRequest = { dialect: 'american' };
const who = contract('Session', session);
const cookies = { 'Set-Cookie': 'The cookies of the session, and the token that goes into X-XSRF-TOKEN.' };

export const peopleOperations: readonly Operation[] = [
  {
    ...{ method: 'post', path: '/session', tag: 'Signing in', who: 'anyone', summary: 'Sign in.' },
    description: 'Sets the cookies that every other request comes with.',
    body: contract('SignInRequest', signIn),
    answers: { 200: { description: 'Who is signed in now.', content: who, headers: cookies } },
    refusals: { 401: 'The address and the password do not belong together.' },
  },
  {
    ...{ method: 'get', path: '/session', tag: 'Signing in', who: 'signed-in', summary: 'Who is signed in?' },
    answers: { 200: { description: 'The person and their shop.', content: who } },
  },
  {
    ...{ method: 'delete', path: '/session', tag: 'Signing in', who: 'anyone', summary: 'Sign out.' },
    answers: { 204: { description: 'Nobody is signed in any more.' } },
  },
  {
    ...{ method: 'post', path: '/session/renewal', tag: 'Signing in', who: 'anyone' },
    summary: 'Renew a session that ran out, by its renewal cookie.',
    answers: { 200: { description: 'Who is signed in.', content: who, headers: cookies } },
    refusals: { 401: 'The session is over: sign in again.' },
  },
  {
    ...{
      method: 'get',
      path: '/people',
      tag: 'People',
      who: 'signed-in',
      summary: 'The people of the shop.',
    },
    answers: {
      200: {
        description: 'By name. A car owner sees those who work there, not the other owners.',
        content: listOf('PersonName', tomasz, imogen),
      },
    },
  },
  {
    ...{ method: 'put', path: '/preferences', tag: 'People', who: 'signed-in' },
    summary: 'Choose one’s own trade words, British or American.',
    body: contract('PreferencesRequest', preferences),
    answers: { 200: { description: 'The session as it is now.', content: who } },
  },
];
