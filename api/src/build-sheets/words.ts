import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { StepDetail } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import { tradeText } from '@second-spanner/shared/contracts/trade-words';
import { printQuantity } from '@second-spanner/shared/quantities/print';
import type { BuildSheet } from './build-sheet.js';

/** `T. Brandt` */
export function initialled(name: string): string {
  const words = name.split(' ');
  const last = words.at(-1) ?? '';
  return words.length < 2
    ? name
    : `${words
        .slice(0, -1)
        .map((word) => `${word.charAt(0)}.`)
        .join(' ')} ${last}`;
}

/** The words of one printed sheet. */
export class Wording {
  constructor(private readonly build: Pick<BuildSheet, 'dialect' | 'tools'>) {}

  say(text: string): string {
    return tradeText(text, this.build.dialect);
  }

  tool(id: string): string {
    return this.build.tools.find((tool) => tool.id === id)?.code ?? '';
  }

  /** What an entry read, in a few words. */
  read(content: EntryContent): string {
    switch (content.kind) {
      case 'check':
        return content.outcome === 'pass' ? 'seen' : 'found wrong';
      case 'measurement':
        return printQuantity(content.value);
      case 'tightening':
        return this.pull(content.setting, content.reading, content.angle);
      case 'wiring':
        return Object.entries(content.fitted)
          .map(([outlet, cylinder]) => `${outlet}: ${cylinder}`)
          .join(', ');
      case 'valve-timing':
        return `${content.sightings.length} ${content.sightings.length === 1 ? 'position' : 'positions'} of the crank`;
      case 'photo':
        return 'photo kept';
    }
  }

  private pull(
    setting: Quantity | undefined,
    reading: Quantity | undefined,
    angle: number | undefined,
  ): string {
    if (reading) return printQuantity(reading);
    if (setting) return `set to ${printQuantity(setting)}`;
    return angle === undefined ? '' : `${angle}°`;
  }
}

/** Who recorded a step, and who checked it again. */
export function people(step: StepDetail): string {
  const recorders = [
    ...new Set(step.entries.filter(({ current }) => current).map(({ by }) => initialled(by.name))),
  ];
  const second = step.countersignatures.find(
    ({ outcome, round }) => outcome === 'agree' && round === step.round,
  );
  if (step.covered) return 'covered';
  return [recorders.join(', '), second && initialled(second.by.name)].filter(Boolean).join('; second: ');
}
