import { renderBuildSheet } from '../build-sheets/render.js';
import { renderWorking } from '../workings/paper/render.js';
import type { PrintTask } from './print-task.js';

/** Makes a PDF on the thread at hand. */
export async function print(task: PrintTask): Promise<Uint8Array> {
  switch (task.kind) {
    case 'build-sheet':
      return renderBuildSheet(task.build);
    case 'working':
      return renderWorking(task.paper);
  }
}
