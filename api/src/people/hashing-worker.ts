import bcrypt from 'bcryptjs';
import { answerTasks } from '../platform/threads/answer-tasks.js';

/** What the hashing thread is asked: to compare with a hash, or to make one of a cost. */
export interface HashingTask {
  readonly password: string;
  readonly against: string | number;
}

answerTasks(({ password, against }: HashingTask) =>
  typeof against === 'number' ? bcrypt.hashSync(password, against) : bcrypt.compareSync(password, against),
);
