/** A place on the cap: x to the right, y upwards from the middle. */
const place = (angle: number): { readonly x: number; readonly y: number } => {
  const radians = (angle * Math.PI) / 180;
  // Rounded, so that posts straight above each other are on one line.
  return { x: Math.round(Math.sin(radians) * 1e6), y: Math.round(Math.cos(radians) * 1e6) };
};

/**
 * The letters of the outlets beside posts, in the posts' own order, as the drawing of a side-outlet cap has
 * them: down the left side first, then down the right.
 *
 * @param angles degrees clockwise from the mark, which is at the top
 */
export function outletLetters(angles: readonly number[]): readonly string[] {
  const fromLeft = angles
    .map((angle, index) => ({ index, ...place(angle) }))
    .sort((a, b) => a.x - b.x || b.y - a.y);
  const half = Math.ceil(angles.length / 2);
  const downwards = [fromLeft.slice(0, half), fromLeft.slice(half)].flatMap((side) =>
    side.sort((a, b) => b.y - a.y),
  );
  return angles.map((_, index) =>
    String.fromCharCode(65 + downwards.findIndex((post) => post.index === index)),
  );
}
