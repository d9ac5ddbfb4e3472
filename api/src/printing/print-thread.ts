import { TaskThread } from '../platform/threads/task-thread.js';
import type { Print, PrintTask } from './print-task.js';

/**
 * Makes PDFs on a thread of its own, which keeps the fonts parsed: nobody else's request waits for a page.
 * One document after the other.
 */
export function printOnThread(): Print {
  const thread = new TaskThread<PrintTask, Uint8Array>(new URL('./print-worker.js', import.meta.url), {
    // A document is many small pieces, all of them gone in the end: with more room they are swept less often.
    maxYoungGenerationSizeMb: 64,
  });
  thread.start();
  return (task) => thread.ask(task);
}
