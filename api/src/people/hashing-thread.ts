import { TaskThread } from '../platform/threads/task-thread.js';
import type { Hashing } from './hashing.js';
import type { HashingTask } from './hashing-worker.js';

/** Hashes on a thread of its own, so that nobody else's request waits for somebody's password. */
export class HashingThread implements Hashing {
  private readonly thread = new TaskThread<HashingTask, string | boolean>(
    new URL('./hashing-worker.js', import.meta.url),
  );

  async hash(password: string, cost: number): Promise<string> {
    return String(await this.thread.ask({ password, against: cost }));
  }

  async compare(password: string, hash: string): Promise<boolean> {
    return (await this.thread.ask({ password, against: hash })) === true;
  }
}
