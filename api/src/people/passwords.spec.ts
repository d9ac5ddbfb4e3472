import bcrypt from 'bcryptjs';
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

  // bcrypt's work is set by the cost in the hash alone: equal costs take equally long.
  it('are compared for nobody too, with a hash of the same cost as somebody’s', async () => {
    const against: string[] = [];
    const watched = new Passwords(4, {
      ...hashingHere,
      compare: (password, hash) => {
        against.push(hash);
        return hashingHere.compare(password, hash);
      },
    });
    const hash = await watched.hash('parallel-spanners-61');
    await watched.match('parallel-spanners-62', hash);
    await watched.match('parallel-spanners-62', null);
    expect(against).toHaveLength(2);
    expect(against[1]).toHaveLength(hash.length);
    expect(against.map((each) => bcrypt.getRounds(each))).toEqual([4, 4]);
  });
});
