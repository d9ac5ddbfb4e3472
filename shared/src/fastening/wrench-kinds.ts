/** Torque wrenches that are set and click, and those that are read. */
export const wrenchKinds = ['click', 'dial', 'digital'] as const;
