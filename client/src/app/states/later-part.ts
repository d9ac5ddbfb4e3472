import { resource, type ResourceRef, type Type } from '@angular/core';
import { ApiProblem } from '../http/api-problem';

/** Brings a component of a page that is not downloaded with the page itself. */
export type LoadPart = () => Promise<Type<unknown>>;

/**
 * What is downloaded when a page first shows it: a part of the page, for `NgComponentOutlet`, or what a part works
 * with. Its state stands in `ss-load-state`, which offers another try when the download fails.
 * @param load what to load as things stand; nothing as long as it is undefined. The same function is called once.
 * @param sentence what is said when it can't be loaded
 */
export function laterPart<T = Type<unknown>>(
  load: () => (() => Promise<T>) | undefined,
  sentence = 'No network. This part of the page has not been opened on this device before.',
): ResourceRef<T | undefined> {
  return resource({
    params: load,
    loader: async ({ params }) => {
      try {
        return await params();
      } catch {
        throw new ApiProblem(0, sentence);
      }
    },
  });
}
