import type { CapMapRequest, CapPost, Cylinder, Rotation } from '../../contracts/calculations.js';
import { degrees } from '../../drawing/cap-input.js';
import { mostCylinders } from '../../ignition/firing-order.js';
import { outletLetters } from './outlet-letters.js';
import { readAngles, readIntervals, readNumber, readOrder } from './read-texts.js';
import type { FormErrors, FormField, WiringForm } from './wiring-form.js';

/** A post as the page names it: by its angle; and the outlet that stands beside it. */
export interface FormPost {
  /** `315`: the angle to a tenth, 0 to 360. */
  readonly key: string;
  readonly angle: number;
  readonly beside: string;
}

/** A form as far as it can be read. */
export interface ReadForm {
  readonly posts: readonly FormPost[];
  /** Names of the outlets in order of name, where the cap is traced. */
  readonly outlets: readonly string[];
  readonly order: readonly Cylinder[];
  /** Null while something is missing or wrong. */
  readonly cap: CapMapRequest | null;
  readonly errors: FormErrors;
  /** What is still to be said before there is a map, as a sentence. May hold trade-word tokens. */
  readonly missing: string | null;
}

/** Reads a form: the cap it describes, or what is missing, or what is wrong and where. */
export function readForm(form: WiringForm): ReadForm {
  const count = countOf(form.cylinders);
  const order = readOrder(form.order);
  const posts = count === null ? null : postsOf(form, count);
  const intervals = form.intervals.trim() === '' ? undefined : readIntervals(form.intervals);
  const errors = errorsOf({ form, count, order, posts, intervals });
  const missing = missingFrom(form, posts ?? []);
  const read = { posts: posts ?? [], outlets: outletsOf(form, posts ?? []), order, errors, missing };
  if (Object.keys(errors).length > 0 || missing !== null || form.turns === '' || posts === null) {
    return { ...read, cap: null };
  }
  return { ...read, cap: capFrom(form, form.turns, order, posts, intervals ?? undefined) };
}

function countOf(text: string): number | null {
  const count = readNumber(text);
  return count !== null && Number.isInteger(count) && count >= 1 && count <= mostCylinders ? count : null;
}

/** Null where the angles cannot be read. */
function postsOf(form: WiringForm, count: number): readonly FormPost[] | null {
  const angles = anglesOf(form, count);
  if (angles === null) return null;
  const letters = outletLetters(angles);
  return angles.map((angle, i) => {
    const key = degrees(angle);
    return { key, angle, beside: form.beside[key] ?? letters[i] ?? '' };
  });
}

function anglesOf(form: WiringForm, count: number): readonly number[] | null {
  if (form.spacing === 'typed') return readAngles(form.angles);
  const first = readNumber(form.firstAngle);
  return first === null ? null : Array.from({ length: count }, (_, i) => first + (i * 360) / count);
}

function outletsOf(form: WiringForm, posts: readonly FormPost[]): readonly string[] {
  if (form.outlets === 'own') return [];
  const names = new Set([...posts.map(({ beside }) => beside), ...Object.values(form.trace)]);
  return [...names].sort((a, b) => a.localeCompare(b, 'en', { numeric: true }));
}

interface Readings {
  readonly form: WiringForm;
  readonly count: number | null;
  readonly order: readonly Cylinder[];
  readonly posts: readonly FormPost[] | null;
  readonly intervals: readonly number[] | null | undefined;
}

function errorsOf({ form, count, order, posts, intervals }: Readings): FormErrors {
  const errors: Partial<Record<FormField, string>> = {};
  if (count === null) errors.cylinders = `Write how many cylinders there are, from 1 to ${mostCylinders}.`;
  if (count !== null && order.length > 0 && order.length !== count) {
    errors.order = `The order names ${order.length}, and the engine has ${count}. Write it as 1-3-4-2.`;
  }
  if (posts === null && count !== null) {
    if (form.spacing === 'even') errors.firstAngle = 'Write the angle of one post in degrees, such as 45.';
    else errors.angles = 'Write the angles in degrees, such as 45, 135, 225, 315.';
  }
  if (
    posts !== null &&
    posts.length > 0 &&
    form.first !== '' &&
    !posts.some(({ key }) => key === form.first)
  ) {
    errors.first = `No post stands at ${form.first}° now. Choose the post for the first cylinder.`;
  }
  if (intervals === null) errors.intervals = 'Write the intervals in degrees, such as 90-150-90-150.';
  return errors;
}

function missingFrom(form: WiringForm, posts: readonly FormPost[]): string | null {
  if (form.order.trim() === '') return 'Write the firing order, or choose an engine of the spec book.';
  if (form.turns === '') return 'Say which way the rotor turns, and from which side that is seen.';
  if (form.spacing === 'typed' && posts.length === 0) return 'Write at which angles the posts stand.';
  const untraced = form.outlets === 'traced' && posts.some(({ key }) => (form.trace[key] ?? '') === '');
  return untraced ? 'Say for each post which {outlet} it leads to inside the cap.' : null;
}

function capFrom(
  form: WiringForm,
  rotation: Rotation,
  firingOrder: readonly Cylinder[],
  posts: readonly FormPost[],
  intervals: readonly number[] | undefined,
): CapMapRequest {
  const traced = form.outlets === 'traced';
  const nameOf = ({ beside, key }: FormPost): string => (traced ? beside : `${key}°`);
  const first = posts.find(({ key }) => key === form.first) ?? posts[0];
  return {
    firingOrder,
    rotation,
    rotationSeenFrom: form.seenFrom,
    posts: posts.map((post): CapPost => ({ post: nameOf(post), angle: post.angle })),
    ...(first === undefined ? {} : { firstPost: nameOf(first) }),
    ...(intervals === undefined ? {} : { intervals }),
    ...(traced
      ? { trace: Object.fromEntries(posts.map((post) => [nameOf(post), form.trace[post.key] ?? ''])) }
      : {}),
  };
}
