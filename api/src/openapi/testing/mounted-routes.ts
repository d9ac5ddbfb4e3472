import express, { type Express, type Router } from 'express';

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
  readonly handle: unknown;
}

const mountedAt = new WeakMap<object, Map<unknown, string>>();

/**
 * Runs `make` while it is written down where every router is mounted, which Express itself does not keep; answers
 * what it made and every route in it, such as `GET /cars/{id}`.
 */
export function withMountedRoutes(make: () => Express): { made: Express; routes: readonly string[] } {
  const prototype = prototypeWithUse(express.Router());
  const { use } = prototype;
  prototype.use = function (this: Router, ...args: unknown[]): Router {
    const path = typeof args[0] === 'string' ? args[0] : '';
    const places = mountedAt.get(this) ?? new Map<unknown, string>();
    mountedAt.set(this, places);
    for (const handler of args.slice(path === '' ? 0 : 1).flat()) places.set(handler, path);
    return Reflect.apply(use, this, args) as Router;
  } as Router['use'];
  try {
    const made = make();
    return { made, routes: routesOf(made.router, '') };
  } finally {
    prototype.use = use;
  }
}

/** Every router has a prototype of its own before the one that they share. */
function prototypeWithUse(router: object): { use: Router['use'] } {
  const prototype: unknown = Object.getPrototypeOf(router);
  if (typeof prototype !== 'object' && typeof prototype !== 'function')
    throw new Error('Routers have no use.');
  const found = prototype as { use: Router['use'] };
  return Object.hasOwn(found, 'use') ? found : prototypeWithUse(found);
}

function routesOf(router: Router, at: string): readonly string[] {
  const layers = router.stack as readonly unknown[] as readonly Layer[];
  return layers.flatMap(({ route, handle }) => {
    if (route) {
      const path = `${at}${route.path}`.replace(/(.)\/$/, '$1').replaceAll(/:(\w+)/g, '{$1}');
      return Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${path}`);
    }
    const isRouter = typeof handle === 'function' && 'stack' in handle;
    return isRouter ? routesOf(handle as Router, at + (mountedAt.get(router)?.get(handle) ?? '')) : [];
  });
}
