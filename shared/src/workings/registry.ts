import type { Working, WorkingGroup } from './working.js';

export interface WorkingEntry {
  readonly key: string;
  readonly group: WorkingGroup;
  readonly title: string;
  /** The question that it answers, as in the working, so that a list can say it before one is opened. */
  readonly asks: string;
  readonly load: () => Promise<Working>;
}

/** Every working, in the order of its page. Each is loaded when it is opened. */
export const workings: readonly WorkingEntry[] = [
  {
    key: 'wiring-map',
    group: 'wiring',
    title: 'Wiring map',
    asks: 'Which {lead} goes where on the cap, and if they are fitted already, what is wrong with them?',
    load: async () => (await import('./wiring-map/wiring-map.js')).wiringMapWorking,
  },
  {
    key: 'convert',
    group: 'convert',
    title: 'Convert a figure',
    asks: 'What is this figure in the other units?',
    load: async () => (await import('./convert.js')).convertWorking,
  },
];

/** The entry of a key, or undefined. */
export function workingNamed(key: string): WorkingEntry | undefined {
  return workings.find((entry) => entry.key === key);
}
