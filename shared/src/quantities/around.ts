/** An angle in degrees brought into 0° up to, but not including, 360°. Example: −10° is 350°. */
export function around(angle: number): number {
  const rest = angle % 360;
  return rest < 0 ? (rest + 360) % 360 : Math.abs(rest);
}
