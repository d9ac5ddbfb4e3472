import { randomUUID } from 'node:crypto';
import type { SignInRequest } from '@second-spanner/shared/contracts/people';
import type { Database } from '../platform/database/database.js';
import { HttpProblem } from '../platform/errors/http-problem.js';
import type { AccessTokens } from '../platform/signing-in/access-token.js';
import { renewalDays } from '../platform/signing-in/cookies.js';
import type { ReadSession } from '../platform/signing-in/authentication.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { Passwords } from './passwords.js';
import { findAccount } from './people.repository.js';
import { makeRenewalToken, readRenewalToken } from './renewal-token.js';
import { SessionsRepository } from './sessions.repository.js';

/** A session with the tokens for the browser. */
export interface OpenedSession {
  readonly signedIn: SignedIn;
  readonly access: string;
  readonly renewal: string;
}

/** Signing in and out, and the renewal that keeps somebody signed in. */
export class SessionsService {
  constructor(
    private readonly database: Database,
    private readonly passwords: Passwords,
    private readonly tokens: AccessTokens,
    private readonly readSession: ReadSession,
  ) {}

  /** Answers the same, after the same time, for an unknown account, a wrong password and a locked-out person. */
  async signIn({ email, password }: SignInRequest): Promise<OpenedSession> {
    const address = email.trim().toLowerCase();
    const account = await this.database.through('sign_in', address, (manager) =>
      findAccount(manager, address),
    );
    const right = await this.passwords.match(password, account?.passwordHash ?? null);
    if (!account || !right || account.lockedAt !== null) throw refused();
    const { shopId, id: personId } = account;
    const token = makeRenewalToken(shopId, randomUUID());
    await this.database.withShop(shopId, (scope) =>
      new SessionsRepository(scope).insert({
        id: token.sessionId,
        personId,
        tokenHash: token.hash,
        expiresAt: expiry(),
      }),
    );
    return this.opened(token, personId);
  }

  /** Exchanges a renewal token for a new one. One that was exchanged before ends the whole session. */
  async renew(text: string | null): Promise<OpenedSession> {
    const token = text === null ? null : readRenewalToken(text);
    if (!token) throw over();
    const next = makeRenewalToken(token.shopId, token.sessionId);
    const personId = await this.database.withShop(token.shopId, async (scope) => {
      const sessions = new SessionsRepository(scope);
      const session = await sessions.lock(token.sessionId);
      if (!session || session.endedAt !== null || session.expiresAt <= new Date()) return null;
      if (session.tokenHash !== token.hash) {
        await sessions.end(session.id, 'token-reused');
        return null;
      }
      await sessions.renew(session.id, next.hash, expiry());
      return session.personId;
    });
    if (personId === null) throw over();
    return this.opened(next, personId);
  }

  async signOut(shopId: string, sessionId: string): Promise<void> {
    await this.database.withShop(shopId, (scope) =>
      new SessionsRepository(scope).end(sessionId, 'signed-out'),
    );
  }

  /** Signs out by the renewal token alone, when the access token has run out. */
  async signOutByToken(text: string): Promise<void> {
    const token = readRenewalToken(text);
    if (!token) return;
    await this.database.withShop(token.shopId, async (scope) => {
      const sessions = new SessionsRepository(scope);
      const session = await sessions.lock(token.sessionId);
      if (session?.tokenHash === token.hash) await sessions.end(session.id, 'signed-out');
    });
  }

  private async opened(
    token: { readonly shopId: string; readonly sessionId: string; readonly text: string },
    personId: string,
  ): Promise<OpenedSession> {
    const claims = { shopId: token.shopId, sessionId: token.sessionId, personId };
    const signedIn = await this.readSession(claims);
    if (!signedIn) throw over();
    return { signedIn, access: this.tokens.sign(claims), renewal: token.text };
  }
}

const expiry = (): Date => new Date(Date.now() + renewalDays * 86_400_000);

const refused = (): HttpProblem =>
  new HttpProblem('not-signed-in', 'E-mail address and password do not belong together.');

const over = (): HttpProblem => new HttpProblem('not-signed-in', 'The session is over. Sign in again.');
