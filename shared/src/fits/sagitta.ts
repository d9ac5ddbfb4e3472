/**
 * How far a circle falls from its top to the edges of a slot across it: R − √(R² − (b/2)²), in the unit of
 * diameter and width, which is at most the diameter. Source: geometry of the circle.
 * Example: 20 mm shaft, 6 mm slot: 0.461 mm.
 */
export function sagitta(diameter: number, width: number): number {
  const radius = diameter / 2;
  const half = width / 2;
  // The plain difference loses its digits where the slot is narrow.
  return (half * half) / (radius + Math.sqrt(radius * radius - half * half));
}
