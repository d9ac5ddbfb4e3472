/** Crockford's base 32: no letter that is taken for a digit. */
const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';
const bitsEach = 5;
const length = 8;

/**
 * The codes that a hash can give, in order: the first, and others should it be taken. Eight characters of
 * Crockford's base 32, as `XXXX-XXXX`.
 * @param hash 64 hexadecimal digits
 */
export function codesOf(hash: string): string[] {
  const bits = [...hash].map((digit) => parseInt(digit, 16).toString(2).padStart(4, '0')).join('');
  const each = bitsEach * length;
  return Array.from({ length: Math.floor(bits.length / each) }, (_none, index) =>
    toCode(bits.slice(index * each, (index + 1) * each)),
  );
}

function toCode(bits: string): string {
  const characters = bits.match(/.{5}/g) ?? [];
  const text = characters.map((five) => alphabet.charAt(parseInt(five, 2))).join('');
  return `${text.slice(0, 4)}-${text.slice(4)}`;
}

/** A code as somebody typed it, made into its one form; null when it cannot be one. */
export function readCode(typed: string): string | null {
  const text = typed.toUpperCase().replace(/[\s-]/g, '').replaceAll('O', '0').replace(/[IL]/g, '1');
  if (text.length !== length || [...text].some((character) => !alphabet.includes(character))) return null;
  return `${text.slice(0, 4)}-${text.slice(4)}`;
}
