import bcrypt from 'bcryptjs';

/** Where passwords are hashed: a slow thing by intent. */
export interface Hashing {
  hash(password: string, cost: number): Promise<string>;
  compare(password: string, hash: string): Promise<boolean>;
}

/** On the thread that asks. */
export const hashingHere: Hashing = {
  hash: (password, cost) => bcrypt.hash(password, cost),
  compare: (password, hash) => bcrypt.compare(password, hash),
};
