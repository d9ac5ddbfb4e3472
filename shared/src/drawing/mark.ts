import { group, path, type Drawing } from './shapes.js';

/** One spanner, jaw up, about the middle of its jaw; both shapes come from the mark's own drawing. */
const solid =
  'M-0.89 -4.62L-1.92 -0.77L-0.36 1.34L2.04 0.29L3.07 -3.55A4.7 4.7 0 0 1 1.75 4.36L1.75 16.45' +
  'A1.75 1.75 0 0 1 -1.75 16.45L-1.75 4.36A4.7 4.7 0 0 1 -0.89 -4.62Z';
const outline =
  'M-0.95 -3.99L-1.83 -0.69L-0.35 1.32L1.93 0.32L2.82 -2.98A4.1 4.1 0 0 1 1.25 3.9L1.25 16.35' +
  'A1.25 1.25 0 0 1 -1.25 16.35L-1.25 3.9A4.1 4.1 0 0 1 -0.95 -3.99Z';

/** Two spanners side by side, one solid, one in outline: the first reading and the second. */
export const mark: Drawing = {
  title: 'Second Spanner',
  description: 'Two open-ended spanners side by side, one solid, one in outline.',
  width: 24,
  height: 24,
  shapes: [
    group(6.1, 5.1, 0, [path(solid, { fill: 'blue' })]),
    group(17.6, 5.1, 0, [path(outline, { pen: 'sign-blue' })]),
  ],
  table: { columns: [], rows: [] },
};
