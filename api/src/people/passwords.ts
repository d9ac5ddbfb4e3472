import bcrypt from 'bcryptjs';
import type { Hashing } from './hashing.js';

/** Hashes and compares passwords. */
export class Passwords {
  /** What an unknown account is compared with, so that it takes as long as a known one. No password has it. */
  private readonly nobodys: string;

  constructor(
    private readonly cost: number,
    private readonly hashing: Hashing,
  ) {
    this.nobodys = `$2b$${String(cost).padStart(2, '0')}$${'u'.repeat(53)}`;
  }

  async hash(password: string): Promise<string> {
    return this.hashing.hash(password, this.cost);
  }

  /** Whether the password belongs to the hash; without a hash never, after the same time. */
  async match(password: string, hash: string | null): Promise<boolean> {
    const matches = await this.hashing.compare(password, hash ?? this.nobodys);
    // The bytes that bcrypt drops must not match by being dropped.
    return matches && hash !== null && !bcrypt.truncates(password);
  }
}
