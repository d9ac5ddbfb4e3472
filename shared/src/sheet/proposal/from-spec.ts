import type { CapMapRequest, ValveTiming } from '../../contracts/calculations.js';
import type { SpecDocument } from '../../contracts/spec.js';

/** The cap of an engine, as the wiring map is worked out from it. */
export function capRequestOf({ engine, ignition }: SpecDocument): CapMapRequest {
  return {
    firingOrder: engine.firingOrder.value,
    rotation: ignition.rotation.value,
    rotationSeenFrom: ignition.rotationSeenFrom.value,
    posts: ignition.posts.value,
    firstPost: ignition.firstPost.value,
    ...(ignition.trace && { trace: ignition.trace.value }),
  };
}

/** An engine's valve timing, at the lift or clearance that the spec quotes it at. */
export function valveTimingOf({ valveTrain }: SpecDocument): ValveTiming {
  return valveTrain.timing.value;
}

/** `Cylinder 1` and so on, in number order. */
export function cylinderNames({ engine }: SpecDocument): readonly string[] {
  return Array.from({ length: engine.cylinders.value }, (_, index) => `Cylinder ${index + 1}`);
}

export const isVee = ({ engine }: SpecDocument): boolean => engine.layout.value === 'vee';

/** The first cylinder of the firing order, at whose TDC the engine is timed. */
export const firstCylinder = ({ engine }: SpecDocument): number => engine.firingOrder.value[0] ?? 1;
