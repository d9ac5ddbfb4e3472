import { Worker, type ResourceLimits } from 'node:worker_threads';
import type { Outcome, Task } from './answer-tasks.js';

interface Waiting<Answer> {
  readonly resolve: (answer: Answer) => void;
  readonly reject: (error: Error) => void;
}

/** A thread of its own for slow work, so that no other request waits for it. Its file calls `answerTasks`. */
export class TaskThread<Question, Answer> {
  private readonly waiting = new Map<number, Waiting<Answer>>();
  private worker: Worker | null = null;
  private last = 0;

  constructor(
    private readonly file: URL,
    private readonly resourceLimits: ResourceLimits = {},
  ) {}

  /** Starts the thread, unless it runs: the first question need not wait for that then. */
  start(): void {
    this.running();
  }

  /** @throws what the work threw; an Error when the thread ended meanwhile: the next question starts another */
  async ask(question: Question): Promise<Answer> {
    const task: Task<Question> = { id: ++this.last, question };
    return new Promise((resolve, reject) => {
      this.running().postMessage(task);
      this.waiting.set(task.id, { resolve, reject });
    });
  }

  private running(): Worker {
    if (this.worker) return this.worker;
    const worker = new Worker(this.file, { resourceLimits: this.resourceLimits });
    worker.on('message', (outcome: Outcome<Answer>) => {
      this.answered(outcome);
    });
    worker.on('error', () => {
      this.died(worker);
    });
    worker.on('exit', () => {
      this.died(worker);
    });
    // Alone it keeps no process alive.
    worker.unref();
    this.worker = worker;
    return worker;
  }

  private answered(outcome: Outcome<Answer>): void {
    const asked = this.waiting.get(outcome.id);
    this.waiting.delete(outcome.id);
    if ('error' in outcome) asked?.reject(outcome.error);
    else asked?.resolve(outcome.answer);
  }

  private died(worker: Worker): void {
    if (this.worker !== worker) return;
    this.worker = null;
    const asked = [...this.waiting.values()];
    this.waiting.clear();
    for (const { reject } of asked) reject(new Error('The thread ended before it answered.'));
  }
}
