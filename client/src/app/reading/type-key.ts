export const keypadKeys = [
  ['7', '8', '9', 'back'],
  ['4', '5', '6', 'sign'],
  ['1', '2', '3', 'fraction'],
  ['.', '0', ',', 'space'],
] as const;
export type KeypadKey = (typeof keypadKeys)[number][number];

/** A text field's text and what is marked in it; start and end are the same at a bare caret. */
export interface Typed {
  readonly text: string;
  readonly start: number;
  readonly end: number;
}

const characters: Partial<Record<KeypadKey, string>> = { fraction: '/', space: ' ' };

/** The field after one key of the keypad, with the caret behind what was typed. */
export function typeKey(typed: Typed, key: KeypadKey): Typed {
  if (key === 'sign') return turnSign(typed);
  if (key === 'back') {
    const from = typed.start === typed.end ? Math.max(0, typed.start - 1) : typed.start;
    return put(typed, from, '');
  }
  return put(typed, typed.start, characters[key] ?? key);
}

function put({ text, end }: Typed, from: number, what: string): Typed {
  const caret = from + what.length;
  return { text: text.slice(0, from) + what + text.slice(end), start: caret, end: caret };
}

/** The sign belongs to the whole figure, wherever the caret stands. */
function turnSign({ text, start, end }: Typed): Typed {
  const isNegative = /^[-−]/.test(text);
  const moved = isNegative ? -1 : 1;
  return {
    text: isNegative ? text.slice(1) : `−${text}`,
    start: Math.max(0, start + moved),
    end: Math.max(0, end + moved),
  };
}
