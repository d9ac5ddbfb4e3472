import { TaskThread } from '../platform/threads/task-thread.js';
import type { BuildSheet, RenderBuildSheet } from './build-sheet.js';

/**
 * Renders build sheets on a thread of its own, which keeps the fonts parsed: nobody else's request waits for a page.
 * One sheet after the other.
 */
export function renderOnThread(): RenderBuildSheet {
  const thread = new TaskThread<BuildSheet, Uint8Array>(new URL('./render-worker.js', import.meta.url), {
    // A document is many small pieces, all of them gone in the end: with more room they are swept less often.
    maxYoungGenerationSizeMb: 64,
  });
  thread.start();
  return (build) => thread.ask(build);
}
