import { randomBytes } from 'node:crypto';
import type { CookieOptions, Request, Response } from 'express';
import { accessSeconds } from './access-token.js';

export const renewalDays = 14;
/** Angular's own pair of names. */
export const xsrfCookie = 'XSRF-TOKEN';
export const xsrfHeader = 'x-xsrf-token';
const day = 86_400_000;

/** Sets and reads the cookies of a session: secure ones where the workbench is reached over https. */
export class SessionCookies {
  private readonly secure: boolean;
  /** The cookie that a session is told by. */
  readonly accessName: string;
  private readonly renewalName: string;

  constructor(publicUrl: URL) {
    this.secure = publicUrl.protocol === 'https:';
    // A browser takes __Host- and __Secure- names only as they are meant; without https it takes none.
    this.accessName = this.secure ? '__Host-access' : 'second_spanner_access';
    this.renewalName = this.secure ? '__Secure-renewal' : 'second_spanner_renewal';
  }

  access(request: Request): string | null {
    return cookieOf(request, this.accessName);
  }

  renewal(request: Request): string | null {
    return cookieOf(request, this.renewalName);
  }

  set(response: Response, access: string, renewal: string): void {
    response.cookie(this.accessName, access, { ...this.accessOptions(), maxAge: accessSeconds * 1000 });
    response.cookie(this.renewalName, renewal, { ...this.renewalOptions(), maxAge: renewalDays * day });
  }

  clear(response: Response): void {
    response.clearCookie(this.accessName, this.accessOptions());
    response.clearCookie(this.renewalName, this.renewalOptions());
  }

  /** Gives the browser an XSRF token that its own scripts read, unless it has one. */
  setXsrf(request: Request, response: Response, { anew = false } = {}): void {
    if (!anew && cookieOf(request, xsrfCookie) !== null) return;
    response.cookie(xsrfCookie, randomBytes(24).toString('base64url'), {
      secure: this.secure,
      sameSite: 'strict',
      path: '/',
    });
  }

  private accessOptions(): CookieOptions {
    return { httpOnly: true, secure: this.secure, sameSite: 'strict', path: '/' };
  }

  private renewalOptions(): CookieOptions {
    return { ...this.accessOptions(), path: '/api/session' };
  }
}

function cookieOf(request: Request, name: string): string | null {
  const cookies = request.cookies as Readonly<Record<string, unknown>>;
  const value = cookies[name];
  return typeof value === 'string' && value !== '' ? value : null;
}
