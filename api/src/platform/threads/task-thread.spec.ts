import { describe, expect, it } from 'vitest';
import { TaskThread } from './task-thread.js';

// What a thread does, without `answerTasks`: that one is TypeScript until it is compiled.
const file = new URL(
  `data:text/javascript,${encodeURIComponent(`
    import { parentPort } from 'node:worker_threads';
    parentPort.on('message', ({ id, question }) => {
      if (question === 'end') process.exit(1);
      if (question === 'throw') parentPort.postMessage({ id, error: new RangeError('not that') });
      else parentPort.postMessage({ id, answer: question + '!' });
    });
  `)}`,
);

describe('a thread for slow work', () => {
  const thread = new TaskThread<string, string>(file);

  it('answers each question with its own answer', async () => {
    expect(await Promise.all(['a', 'b', 'c'].map((each) => thread.ask(each)))).toEqual(['a!', 'b!', 'c!']);
  });

  it('passes on what the work threw, and works on', async () => {
    await expect(thread.ask('throw')).rejects.toThrow('not that');
    expect(await thread.ask('a')).toBe('a!');
  });

  it('fails whoever waits when it ends, and is there again for the next', async () => {
    const asked = await Promise.allSettled([thread.ask('end'), thread.ask('a')]);
    expect(asked.map(({ status }) => status)).toEqual(['rejected', 'rejected']);
    expect(await thread.ask('a')).toBe('a!');
  });

  it('refuses what no thread can be sent, and works on', async () => {
    const unsendable = (() => 'a') as unknown as string;
    await expect(thread.ask(unsendable)).rejects.toThrow('could not be cloned');
    expect(await thread.ask('a')).toBe('a!');
  });
});
