import { HttpContext, HttpContextToken } from '@angular/common/http';

/** Whether a 401 is this request's answer, and nothing to renew the session for. */
export const takesRefusal = new HttpContextToken(() => false);

/** For a request that asks whether the session still runs. */
export const withoutRenewal = (): HttpContext => new HttpContext().set(takesRefusal, true);
