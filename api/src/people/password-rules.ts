import { commonPasswords } from './common-passwords.js';

const fewestCharacters = 12;
/** bcrypt compares 72 bytes and drops the rest. */
const mostBytes = 72;

/** Why a password cannot be taken, as a sentence; null when it can. */
export function passwordTrouble(password: string): string | null {
  if ([...password].length < fewestCharacters) {
    return `A password has ${fewestCharacters} characters or more.`;
  }
  if (Buffer.byteLength(password, 'utf8') > mostBytes) {
    return `A password has at most ${mostBytes} bytes; letters beyond plain ones count two to four.`;
  }
  if (new Set(password.toLowerCase()).size < 5 || commonPasswords.has(password.toLowerCase())) {
    return 'This password is one of those that are tried first.';
  }
  return null;
}
