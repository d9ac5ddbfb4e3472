import { parentPort } from 'node:worker_threads';
import bcrypt from 'bcryptjs';

/** What the hashing thread is asked: to compare with a hash, or to make one of a cost. */
export interface HashingTask {
  readonly id: number;
  readonly password: string;
  readonly against: string | number;
}

export interface HashingAnswer {
  readonly id: number;
  readonly result?: string | boolean;
  readonly error?: string;
}

parentPort?.on('message', ({ id, password, against }: HashingTask) => {
  let answer: HashingAnswer;
  try {
    const result =
      typeof against === 'number'
        ? bcrypt.hashSync(password, against)
        : bcrypt.compareSync(password, against);
    answer = { id, result };
  } catch (error) {
    answer = { id, error: String(error) };
  }
  parentPort?.postMessage(answer);
});
