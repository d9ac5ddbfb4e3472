import { Router } from 'express';
import { signInLimits } from '../platform/http/rate-limits.js';
import { notSignedIn } from '../platform/errors/http-problem.js';
import { signedInOnly } from '../platform/signing-in/authentication.js';
import type { SessionCookies } from '../platform/signing-in/cookies.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { parseBody } from '../platform/validation/parse-body.js';
import { PreferencesDto, SignInDto } from './people.dto.js';
import type { PeopleService } from './people.service.js';
import type { SessionsService } from './sessions.service.js';

/** `/session`: who is signed in. */
export function sessionRoutes(sessions: SessionsService, cookies: SessionCookies): Router {
  const router = Router();
  router.post('/', ...signInLimits(), async (request, response) => {
    const { signedIn: who, access, renewal } = await sessions.signIn(parseBody(SignInDto, request.body));
    cookies.set(response, access, renewal);
    cookies.setXsrf(request, response, { anew: true });
    response.json({ person: who.person, shop: who.shop });
  });
  router.get('/', (request, response) => {
    cookies.setXsrf(request, response);
    if (!request.signedIn) throw notSignedIn();
    const { person, shop } = request.signedIn;
    response.json({ person, shop });
  });
  router.delete('/', async (request, response) => {
    const renewal = cookies.renewal(request);
    if (request.signedIn) await sessions.signOut(request.signedIn.shop.id, request.signedIn.sessionId);
    else if (renewal !== null) await sessions.signOutByToken(renewal);
    cookies.clear(response);
    response.status(204).end();
  });
  router.post('/renewal', async (request, response) => {
    const { signedIn: who, access, renewal } = await sessions.renew(cookies.renewal(request));
    cookies.set(response, access, renewal);
    response.json({ person: who.person, shop: who.shop });
  });
  return router;
}

/** `/people`: the people of the shop. */
export function peopleRoutes(people: PeopleService): Router {
  const router = Router();
  router.get('/', signedInOnly, async (request, response) => {
    response.json(await people.list(signedIn(request)));
  });
  return router;
}

/** `/preferences`: what a person chooses for themselves. */
export function preferencesRoutes(people: PeopleService): Router {
  const router = Router();
  router.put('/', signedInOnly, async (request, response) => {
    const { dialect } = parseBody(PreferencesDto, request.body);
    response.json(await people.setDialect(signedIn(request), dialect));
  });
  return router;
}
