import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { HttpProblem } from '../errors/http-problem.js';
import { accountOf } from '../signing-in/authentication.js';

const quarterOfAnHour = 15 * 60_000;

const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? '');

interface Limit {
  readonly limit: number;
  readonly windowMs: number;
  readonly key: (request: Request) => string;
  readonly sentence: string;
  readonly onlyFailures?: boolean;
}

const limited = ({ limit, windowMs, key, sentence, onlyFailures = false }: Limit): RequestHandler =>
  rateLimit({
    limit,
    windowMs,
    keyGenerator: key,
    skipSuccessfulRequests: onlyFailures,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: () => {
      throw new HttpProblem('too-many-requests', sentence);
    },
  });

/** All requests together: by account where there is one, by address otherwise. Generous; stops a runaway. */
export const generalLimit = (requestsPerMinute: number): RequestHandler =>
  limited({
    limit: requestsPerMinute,
    windowMs: 60_000,
    key: (request) => accountOf(request) ?? addressOf(request),
    sentence: 'These are too many requests. Wait a minute.',
  });

/** Guessing of passwords: failed sign-ins by account and address together, and by address alone. */
export const signInLimits = (): readonly RequestHandler[] => [
  limited({
    limit: 100,
    windowMs: quarterOfAnHour,
    key: addressOf,
    onlyFailures: true,
    sentence: 'Too many failed sign-ins from here. Wait a quarter of an hour.',
  }),
  limited({
    limit: 10,
    windowMs: quarterOfAnHour,
    key: (request) => `${emailOf(request.body)} ${addressOf(request)}`,
    onlyFailures: true,
    sentence: 'Too many failed sign-ins for this account. Wait a quarter of an hour.',
  }),
];

/** Password asked again inside a session, such as for a signature: failures by account. */
export const passwordLimit = (): RequestHandler =>
  limited({
    limit: 10,
    windowMs: quarterOfAnHour,
    key: (request) => accountOf(request) ?? addressOf(request),
    onlyFailures: true,
    sentence: 'Too many wrong passwords. Wait a quarter of an hour.',
  });

/** Photos, each of which is unpacked and stored: by account. More than anybody takes at an engine in an hour. */
export const uploadLimit = (): RequestHandler =>
  limited({
    limit: 120,
    windowMs: 60 * 60_000,
    key: (request) => accountOf(request) ?? addressOf(request),
    sentence: 'These are too many photos within an hour. Wait a while.',
  });

/** What needs no sign-in, such as verifying a code on paper: by address. */
export const publicLimit = (): RequestHandler =>
  limited({
    limit: 60,
    windowMs: 60_000,
    key: addressOf,
    sentence: 'These are too many requests. Wait a minute.',
  });

function emailOf(body: unknown): string {
  const email = typeof body === 'object' && body !== null && 'email' in body ? body.email : undefined;
  return typeof email === 'string' ? email.trim().toLowerCase().slice(0, 254) : '';
}
