/**
 * What a shop's sheet codes begin with: the first letters of its first two words, in the basic alphabet, which
 * file names, headers and labels can all hold. `Low Mill Motor Works` gives `LM`; a name without such letters `S`.
 */
export function shopInitials(shop: string): string {
  const words = shop
    .normalize('NFD')
    .split(/\s+/)
    .map((word) => word.replaceAll(/[^A-Za-z]/g, ''))
    .filter((word) => word !== '');
  const letters = words.slice(0, 2).map((word) => word.charAt(0).toUpperCase());
  return letters.join('') || 'S';
}
