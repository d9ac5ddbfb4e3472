import type { StepDefinition } from '@second-spanner/shared/contracts/steps';
import type { LoadPart } from '../../states/later-part';
import type { ShownStep } from '../shown-step';

const inspect: LoadPart = async () => (await import('./inspect')).Inspect;
const readSetting: LoadPart = async () => (await import('./read-setting')).ReadSetting;
const measureAgain: LoadPart = async () => (await import('./measure-again')).MeasureAgain;
const readLeadsAgain: LoadPart = async () => (await import('./read-leads-again')).ReadLeadsAgain;
const lookAgain: LoadPart = async () => (await import('./look-again')).LookAgain;

/** First and second side by side. */
export const loadCompared: LoadPart = async () => (await import('./compared')).Compared;

/** A way of checking a step, with what it works on. */
export interface SecondCheckPart {
  readonly load: LoadPart;
  readonly inputs: Record<string, unknown>;
}

/** How the second person checks a step; null where its kind has no such check. Only that way is downloaded. */
export function checkOf({ secondCheck, definition }: ShownStep): SecondCheckPart | null {
  if (secondCheck === 'inspected') return { load: inspect, inputs: { lookFor: definition.lookFor ?? [] } };
  if (secondCheck === 'setting-and-pull-witnessed') {
    return definition.kind === 'tightening' ? { load: readSetting, inputs: { definition } } : null;
  }
  return readAgain(definition, secondCheck === 'strip-read-again');
}

function readAgain(definition: StepDefinition, isStrip: boolean): SecondCheckPart | null {
  switch (definition.kind) {
    case 'measurement':
      return { load: measureAgain, inputs: { definition, isStrip } };
    case 'wiring':
      return { load: readLeadsAgain, inputs: { definition } };
    case 'valve-timing':
      return { load: lookAgain, inputs: { definition } };
    case 'check':
    case 'tightening':
    case 'photo':
      return null;
  }
}
