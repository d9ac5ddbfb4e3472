import { AsyncLocalStorage } from 'node:async_hooks';

/**
 * A clock that the demo's past is written by: it stands where it is put, and goes a little on at every look. Each
 * story has a time of its own, so that several can be told at once.
 */
export class DemoClock {
  private readonly story = new AsyncLocalStorage<{ time: number }>();

  /** Tells a story from a moment on. */
  tell<T>(from: Date, story: () => Promise<T>): Promise<T> {
    return this.story.run({ time: from.getTime() }, story);
  }

  /** Puts the clock of the story forward; it never goes back. */
  moveTo(time: Date): void {
    const story = this.story.getStore();
    if (story) story.time = Math.max(story.time, time.getTime());
  }

  readonly now = (): Date => {
    const story = this.story.getStore();
    if (!story) return new Date();
    story.time += 35_000;
    return new Date(story.time);
  };
}

const hour = 3_600_000;
const day = 24 * hour;

/**
 * The moment in a span of working days at which a share of the work was done: from eight in the morning for eight
 * hours a day; on the day at hand never later than an hour ago.
 */
export function workingTime(today: Date, fromDaysAgo: number, toDaysAgo: number, share: number): Date {
  const days = (fromDaysAgo - toDaysAgo + 1) * share;
  const whole = Math.min(Math.floor(days), fromDaysAgo - toDaysAgo);
  const date = new Date(today.getTime() - (fromDaysAgo - whole) * day);
  const morning = new Date(date);
  morning.setUTCHours(8, 0, 0, 0);
  const latest = today.getTime() - hour;
  const begin = Math.min(morning.getTime(), latest - 4 * hour);
  const at = begin + (days - whole) * 8 * hour;
  return new Date(Math.min(at, latest));
}
