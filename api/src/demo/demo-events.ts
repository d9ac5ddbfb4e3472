import type { EntryContent } from '@second-spanner/shared/contracts/steps';
import type { Quantity } from '@second-spanner/shared/contracts/quantity';
import type { DemoEvent, DemoReadings } from './demo-sheet-file.js';

/** How one step is played. */
export interface PlayedStep {
  readonly readings: DemoReadings | undefined;
  readonly events: readonly DemoEvent[];
  readonly isChecked: boolean;
  /** Only the pulls up to and with this one. */
  readonly lastPull: { readonly pass: number; readonly fastener: string } | undefined;
}

export type EventOf<W extends DemoEvent['what']> = Extract<DemoEvent, { what: W }>;

/** The event of one kind on a step, if there is one. */
export const eventOf = <W extends DemoEvent['what']>(
  { events }: PlayedStep,
  what: W,
): EventOf<W> | undefined => events.find((event): event is EventOf<W> => event.what === what);

/** Whether an entry is the one that a correction is about. */
export function isOf(content: EntryContent, { at, pull }: EventOf<'correction'>): boolean {
  if (content.kind === 'measurement') return content.at === at;
  return content.kind === 'tightening' && content.pass === pull?.pass && content.fastener === pull.fastener;
}

/** The entry with another figure. */
export function withFigure(content: EntryContent, figure: Quantity): EntryContent {
  if (content.kind === 'measurement') return { ...content, value: figure };
  return content.kind === 'tightening' ? { ...content, reading: figure } : content;
}
