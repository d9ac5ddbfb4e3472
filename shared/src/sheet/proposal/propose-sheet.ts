import type { SpecDocument } from '../../contracts/spec.js';
import type { StepDefinition } from '../../contracts/steps.js';
import { cautionsOf } from './cautions.js';
import type { Draft, StageProposal } from './draft.js';
import { stage01 } from './stage-01.js';
import { stage02 } from './stage-02.js';
import { stage03 } from './stage-03.js';
import { stage04 } from './stage-04.js';
import { stage05 } from './stage-05.js';
import { stage06 } from './stage-06.js';
import { stage07 } from './stage-07.js';
import { stage08 } from './stage-08.js';
import { stage09 } from './stage-09.js';
import { stage10 } from './stage-10.js';
import { stage11 } from './stage-11.js';
import { stage12 } from './stage-12.js';
import { stage13 } from './stage-13.js';
import { stage14 } from './stage-14.js';

export { capRequestOf, valveTimingOf } from './from-spec.js';

export interface ProposedStage {
  readonly stage: number;
  /** Trade-word tokens allowed. */
  readonly title: string;
  /** Ends in a hold point. */
  readonly hold: boolean;
  readonly cautions: readonly string[];
}

export interface ProposedSheet {
  readonly stages: readonly ProposedStage[];
  readonly steps: readonly StepDefinition[];
}

const stages: readonly { title: string; hold: boolean; propose: StageProposal }[] = [
  { title: 'Clean, identify, measure', hold: true, propose: stage01 },
  { title: 'Plugs, cam bearings, camshaft', hold: false, propose: stage02 },
  { title: 'Crankshaft, main bearings, {end float}', hold: true, propose: stage03 },
  { title: 'Pistons, rods, deck', hold: true, propose: stage04 },
  { title: 'Timing drive, cam timing', hold: true, propose: stage05 },
  { title: 'Oil pump, seals, front cover, crank pulley, key, {sump}', hold: false, propose: stage06 },
  { title: 'Cylinder head built', hold: false, propose: stage07 },
  { title: 'Head on', hold: true, propose: stage08 },
  { title: 'Valve gear and {clearances}', hold: true, propose: stage09 },
  { title: 'Manifolds, water pump, belt', hold: false, propose: stage10 },
  { title: 'TDC, distributor, ignition, wiring', hold: true, propose: stage11 },
  { title: 'Primed and ready', hold: true, propose: stage12 },
  { title: 'First start', hold: false, propose: stage13 },
  { title: 'After the run', hold: false, propose: stage14 },
];

/**
 * What a sheet proposes before anybody edits it: the fourteen stages, filled from a spec. Only steps that the spec
 * has something for. The last critical step of a stage that holds is its hold point.
 */
export function proposeSheet(document: SpecDocument): ProposedSheet {
  const drafts = stages.flatMap(({ propose, hold }, index) => {
    const drafted = propose(document);
    const holdAt = hold ? drafted.map(({ body }) => body.critical).lastIndexOf(true) : -1;
    return drafted.map((draft, at) => ({
      draft,
      stage: index + 1,
      code: `${index + 1}.${at + 1}`,
      hold: at === holdAt,
    }));
  });
  return {
    stages: stages.map(({ title, hold }, index) => ({
      stage: index + 1,
      title,
      hold,
      cautions: cautionsOf(document, index + 1),
    })),
    steps: drafts.map(({ draft, ...place }, at) => ({
      ...draft.body,
      ...place,
      restsOn: restsOn(draft, drafts.slice(0, at)),
    })),
  };
}

/** Codes of the earlier steps that a draft names, by their whole id or its beginning. */
function restsOn(
  { after }: Draft,
  earlier: readonly { readonly draft: Draft; readonly code: string }[],
): readonly string[] {
  const named = (id: string) => after.some((each) => id === each || id.startsWith(`${each}:`));
  return earlier.filter(({ draft }) => named(draft.id)).map(({ code }) => code);
}
