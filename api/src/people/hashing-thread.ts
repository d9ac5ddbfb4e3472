import { Worker } from 'node:worker_threads';
import type { Hashing } from './hashing.js';
import type { HashingAnswer, HashingTask } from './hashing-worker.js';

interface Waiting {
  readonly resolve: (result: string | boolean) => void;
  readonly reject: (error: Error) => void;
}

/** Hashes on a thread of its own, so that nobody else's request waits for somebody's password. */
export class HashingThread implements Hashing {
  private readonly waiting = new Map<number, Waiting>();
  private worker: Worker | null = null;
  private last = 0;

  async hash(password: string, cost: number): Promise<string> {
    return String(await this.ask(password, cost));
  }

  async compare(password: string, hash: string): Promise<boolean> {
    return (await this.ask(password, hash)) === true;
  }

  private async ask(password: string, against: string | number): Promise<string | boolean> {
    const task: HashingTask = { id: ++this.last, password, against };
    return new Promise((resolve, reject) => {
      this.waiting.set(task.id, { resolve, reject });
      this.running().postMessage(task);
    });
  }

  /** The thread; a new one when there is none, or the last one died. */
  private running(): Worker {
    if (this.worker) return this.worker;
    const worker = new Worker(new URL('./hashing-worker.js', import.meta.url));
    worker.on('message', (answer: HashingAnswer) => {
      this.answered(answer);
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

  private answered({ id, result, error }: HashingAnswer): void {
    const asked = this.waiting.get(id);
    this.waiting.delete(id);
    if (result === undefined) asked?.reject(new Error(error ?? 'The hashing thread gave no answer.'));
    else asked?.resolve(result);
  }

  private died(worker: Worker): void {
    if (this.worker !== worker) return;
    this.worker = null;
    const asked = [...this.waiting.values()];
    this.waiting.clear();
    for (const { reject } of asked) reject(new Error('The hashing thread ended.'));
  }
}
