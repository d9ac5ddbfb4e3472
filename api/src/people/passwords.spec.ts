import { describe, expect, it } from 'vitest';
import { hashingHere } from './hashing.js';
import { passwordTrouble } from './password-rules.js';
import { Passwords } from './passwords.js';

describe('password rules', () => {
  // 12 characters and up, at most 72 bytes, common ones refused: OWASP ASVS 5.0, 6.2.1, 6.2.4 and 6.2.9, but
  // with bcrypt's own bound of 72 bytes.
  it.each([
    ['eleven char', 'characters or more'],
    ['ééééééééééé', 'characters or more'],
    ['passwordpassword', 'tried first'],
    ['PasswordPassword', 'tried first'],
    ['aaaaaaaaaaaaaaaa', 'tried first'],
    [`${'x'.repeat(60)}abcdefghijklm`, 'at most 72 bytes'],
    ['wrench £'.repeat(9), 'at most 72 bytes'],
  ])('refuse %j', (password, words) => {
    expect(passwordTrouble(password)).toContain(words);
  });

  it.each(['parallel-spanners-61', 'twelve chars', 'ключ на тринадцать', `${'abcdefgh'.repeat(9)}`])(
    'take %j',
    (password) => {
      expect(passwordTrouble(password)).toBeNull();
    },
  );
});

describe('passwords', () => {
  const passwords = new Passwords(4, hashingHere);

  it('match their own hash alone', async () => {
    const hash = await passwords.hash('parallel-spanners-61');
    expect(await passwords.match('parallel-spanners-61', hash)).toBe(true);
    expect(await passwords.match('parallel-spanners-62', hash)).toBe(false);
    expect(await passwords.match('nobody has this password', null)).toBe(false);
  });

  // bcrypt itself compares 72 bytes and drops the rest.
  it('do not match by the bytes that bcrypt drops', async () => {
    const long = 'abcdefgh'.repeat(9);
    const hash = await passwords.hash(long);
    expect(await passwords.match(long, hash)).toBe(true);
    expect(await passwords.match(`${long}x`, hash)).toBe(false);
  });

  it('take as long for nobody as for somebody', async () => {
    const slow = new Passwords(10, hashingHere);
    const hash = await slow.hash('parallel-spanners-61');
    const time = async (against: string | null): Promise<number> => {
      const from = performance.now();
      await slow.match('parallel-spanners-62', against);
      return performance.now() - from;
    };
    const times = { somebody: [0], nobody: [0] };
    for (let i = 0; i < 5; i++) {
      times.somebody.push(await time(hash));
      times.nobody.push(await time(null));
    }
    const middle = (list: number[]): number => list.sort((a, b) => a - b)[3] ?? 0;
    expect(middle(times.nobody)).toBeGreaterThan(middle(times.somebody) / 3);
  });
});
