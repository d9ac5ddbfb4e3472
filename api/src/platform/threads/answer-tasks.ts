import { parentPort } from 'node:worker_threads';

/** What a thread is asked. */
export interface Task<Question> {
  readonly id: number;
  readonly question: Question;
}

/** What came of it. */
export type Outcome<Answer> =
  { readonly id: number; readonly answer: Answer } | { readonly id: number; readonly error: Error };

/** Answers, one after the other, everything that the `TaskThread` of this worker is asked. */
export function answerTasks<Question, Answer>(work: (question: Question) => Answer | Promise<Answer>): void {
  const port = parentPort;
  if (!port) throw new Error('This file runs as a worker thread.');
  let before: Promise<void> = Promise.resolve();
  port.on('message', ({ id, question }: Task<Question>) => {
    before = before.then(async () => {
      port.postMessage(await outcomeOf(id, () => work(question)));
    });
  });
}

async function outcomeOf<Answer>(
  id: number,
  work: () => Answer | Promise<Answer>,
): Promise<Outcome<Awaited<Answer>>> {
  try {
    return { id, answer: await work() };
  } catch (error) {
    return { id, error: error instanceof Error ? error : new Error(String(error)) };
  }
}
