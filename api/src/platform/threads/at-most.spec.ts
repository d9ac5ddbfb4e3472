import { expect, it } from 'vitest';
import { AtMost } from './at-most.js';

it('no more tasks run at once than may, failed ones give their place up too', async () => {
  const gate = new AtMost(2);
  let [running, most, done] = [0, 0, 0];
  const task = async (fails: boolean): Promise<void> => {
    running += 1;
    most = Math.max(most, running);
    await new Promise(setImmediate);
    running -= 1;
    if (fails) throw new Error('broken');
    done += 1;
  };
  const tasks = Array.from({ length: 9 }, (_, index) => gate.run(() => task(index % 3 === 0)));
  await Promise.allSettled(tasks);
  await gate.run(() => task(false));
  expect([most, done]).toEqual([2, 7]);
});
