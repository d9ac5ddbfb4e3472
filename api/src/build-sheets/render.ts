import { setImmediate } from 'node:timers/promises';
import type { StageLine, StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { BuildSheet } from './build-sheet.js';
import { front } from './blocks/front.js';
import { needsTable, readings } from './blocks/readings.js';
import { signatures } from './blocks/signatures.js';
import { simpleSteps } from './blocks/simple.js';
import { hasOrder, tightening } from './blocks/tightening.js';
import { wiring } from './blocks/wiring.js';
import { Pages } from '../paper/page.js';
import { frameOf } from './frame.js';
import { Wording } from './words.js';

/**
 * The build sheet as a PDF. Two renderings of the same sheet are the same to the byte.
 * Gives way between the stages to whatever else this thread has to do.
 */
export async function renderBuildSheet(build: BuildSheet): Promise<Buffer> {
  const pages = new Pages(frameOf(build));
  const words = new Wording(build);
  front(pages, build, words);
  const byCode = new Map(build.steps.map((step) => [step.code, step]));
  for (const stage of build.sheet.stages) {
    const steps = stage.steps.map(({ code }) => byCode.get(code)).filter((step) => step !== undefined);
    renderStage(pages, stage, steps, words, build);
    await setImmediate();
  }
  signatures(pages, build);
  return pages.finish();
}

function renderStage(
  pages: Pages,
  stage: StageLine,
  steps: readonly StepDetail[],
  words: Wording,
  build: BuildSheet,
): void {
  if (steps.length === 0) return;
  pages.need(70);
  pages.y += 8;
  const title = `${stage.stage}   ${words.say(stage.title)}`;
  pages.y += pages.text(title, pages.left, pages.y, { font: 'text-medium', size: 14 }) + 3;
  pages.rule(pages.y, 1.1);
  pages.y += 6;
  let row: StepDetail[] = [];
  const flush = (): void => {
    simpleSteps(pages, row, words);
    row = [];
  };
  for (const step of steps) {
    const block = blockOf(step);
    if (!block) {
      row.push(step);
      continue;
    }
    flush();
    block(pages, step, words, build);
  }
  flush();
}

type Block = (pages: Pages, step: StepDetail, words: Wording, build: BuildSheet) => void;

function blockOf(step: StepDetail): Block | null {
  if (step.kind === 'wiring') return wiring;
  if (hasOrder(step)) return tightening;
  if (needsTable(step))
    return (pages, of, words, build) => {
      readings(pages, of, words, build.tools);
    };
  return null;
}
