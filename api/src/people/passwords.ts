import bcrypt from 'bcryptjs';

/** Hashes and compares passwords. */
export class Passwords {
  /** What an unknown account is compared with, so that it takes as long as a known one. */
  private readonly nobody: Promise<string>;

  constructor(private readonly cost: number) {
    this.nobody = bcrypt.hash('nobody has this password', cost);
  }

  async hash(password: string): Promise<string> {
    return bcrypt.hash(password, this.cost);
  }

  /** Whether the password belongs to the hash; without a hash never, after the same time. */
  async match(password: string, hash: string | null): Promise<boolean> {
    const matches = await bcrypt.compare(password, hash ?? (await this.nobody));
    // The bytes that bcrypt drops must not match by being dropped.
    return matches && hash !== null && !bcrypt.truncates(password);
  }
}
