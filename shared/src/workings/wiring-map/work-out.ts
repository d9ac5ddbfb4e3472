import type {
  CapDiagnosis,
  CapMap,
  CapMapRequest,
  Cylinder,
  ValveTiming,
} from '../../contracts/calculations.js';
import { InputError } from '../../contracts/input-error.js';
import { degrees } from '../../drawing/cap-input.js';
import { capDiagnosis } from '../../ignition/cap-diagnosis.js';
import { capMap } from '../../ignition/cap-map.js';
import { readForm, type ReadForm } from './cap-of-form.js';
import { readNumber } from './read-texts.js';
import { valveFields, type FormErrors, type FormField, type WiringForm } from './wiring-form.js';

/** A place where a lead is plugged in, as the page names it. */
export interface Place {
  /** Its outlet's name in the cap's request. */
  readonly outlet: string;
  /** What it is kept under in the form: the letter on a traced cap, else the post's angle. */
  readonly key: string;
}

export interface WiringAnswer extends ReadForm {
  readonly map: CapMap | null;
  /** In order of name. */
  readonly places: readonly Place[];
  /** By outlet, once every lead is entered. */
  readonly fitted: Readonly<Record<string, Cylinder>> | null;
  readonly entered: number;
  readonly valveTiming: ValveTiming | undefined;
  readonly advance: number | undefined;
  readonly diagnosis: CapDiagnosis | null;
}

/** Everything that follows from a form: the map, then the diagnosis, or what is missing or wrong and where. */
export function workOut(form: WiringForm): WiringAnswer {
  const read = readForm(form);
  const timing = timingOf(form);
  const advance = readNumber(form.advance);
  const errors: FormErrors = { ...read.errors, ...timing.errors, ...advanceError(form, advance) };
  const nothing = {
    ...read,
    errors,
    map: null,
    places: [],
    fitted: null,
    entered: 0,
    valveTiming: timing.timing,
    advance: advance ?? undefined,
    diagnosis: null,
  };
  const { cap } = read;
  if (cap === null) return nothing;
  const mapped = attempt(() => ({ ...capMap(byAngle(cap)), rows: capMap(cap).rows }));
  if ('error' in mapped) return { ...nothing, cap: null, errors: { ...errors, ...fieldError(mapped.error) } };

  const map = mapped.answer;
  const places = placesOf(map, form);
  const { fitted, entered } = fittedIn(form, places, cap.firingOrder);
  const withMap = { ...nothing, map, places, entered };
  if (fitted === null || Object.keys(errors).length > 0) return withMap;
  const diagnosed = attempt(() => diagnose(cap, fitted, timing.timing, advance ?? undefined));
  if ('error' in diagnosed) return { ...withMap, errors: fieldError(diagnosed.error) };
  return { ...withMap, fitted, diagnosis: diagnosed.answer };
}

/**
 * Posts go by their outlets' names, so that outlets read as posts can be told; the sentence names them by
 * angle, as the page does, wherever it speaks of posts.
 */
function diagnose(
  cap: CapMapRequest,
  fitted: Readonly<Record<string, Cylinder>>,
  valveTiming: ValveTiming | undefined,
  advance: number | undefined,
): CapDiagnosis {
  const request = { fitted, fittedBy: 'outlet' as const, valveTiming, advance };
  const found = capDiagnosis({ ...request, cap });
  if (found.cause === 'outlets-read-as-posts') return found;
  return { ...found, reason: capDiagnosis({ ...request, cap: byAngle(cap) }).reason };
}

/** The same cap with its posts named by angle. */
function byAngle(cap: CapMapRequest): CapMapRequest {
  const names = new Map((cap.posts ?? []).map(({ post, angle }) => [post, `${degrees(angle)}°`]));
  const nameOf = (post: string): string => names.get(post) ?? post;
  return {
    ...cap,
    posts: cap.posts?.map(({ post, angle }) => ({ post: nameOf(post), angle })),
    ...(cap.firstPost === undefined ? {} : { firstPost: nameOf(cap.firstPost) }),
    ...(cap.trace === undefined
      ? {}
      : {
          trace: Object.fromEntries(
            Object.entries(cap.trace).map(([post, outlet]) => [nameOf(post), outlet]),
          ),
        }),
  };
}

function placesOf(map: CapMap, form: WiringForm): readonly Place[] {
  return map.rows
    .map(({ outlet, angle }) => ({ outlet, key: form.outlets === 'traced' ? outlet : degrees(angle) }))
    .sort((a, b) => a.key.localeCompare(b.key, 'en', { numeric: true }));
}

function fittedIn(
  form: WiringForm,
  places: readonly Place[],
  order: readonly Cylinder[],
): Pick<WiringAnswer, 'fitted' | 'entered'> {
  const entries = places.flatMap(({ outlet, key }): readonly (readonly [string, Cylinder])[] => {
    const cylinder = order.find((one) => String(one) === form.fitted[key]);
    return cylinder === undefined ? [] : [[outlet, cylinder]];
  });
  const isWhole = entries.length === places.length;
  return { fitted: isWhole ? Object.fromEntries(entries) : null, entered: entries.length };
}

function timingOf(form: WiringForm): { readonly timing?: ValveTiming; readonly errors: FormErrors } {
  if (valveFields.every((field) => form[field].trim() === '')) return { errors: {} };
  const [ivo, ivc, evo, evc] = valveFields.map((field) => readNumber(form[field]));
  const unread = valveFields.find((field) => readNumber(form[field]) === null);
  if (unread !== undefined) {
    const message = 'Write all four in degrees, or leave all four empty.';
    return { errors: { [unread]: message } };
  }
  return { timing: { ivo: ivo ?? 0, ivc: ivc ?? 0, evo: evo ?? 0, evc: evc ?? 0 }, errors: {} };
}

function advanceError(form: WiringForm, advance: number | null): FormErrors {
  const unread = advance === null && form.advance.trim() !== '';
  return unread ? { advance: 'Write the static timing in degrees before TDC, such as 10.' } : {};
}

const fieldNames: readonly (readonly [RegExp, FormField])[] = [
  [/^firingOrder/, 'order'],
  [/^rotation$/, 'turns'],
  [/^rotationSeenFrom/, 'seenFrom'],
  [/^posts/, 'angles'],
  [/^firstPost/, 'first'],
  [/^intervals/, 'intervals'],
  [/^trace/, 'trace'],
  [/^valveTiming\.ivc/, 'ivc'],
  [/^valveTiming\.evo/, 'evo'],
  [/^valveTiming\.evc/, 'evc'],
  [/^valveTiming/, 'ivo'],
  [/^advance/, 'advance'],
];

/** The error of a calculation at the field of the form that it is about. */
function fieldError({ field, message }: InputError): FormErrors {
  const path = field.replace(/^cap\./, '');
  const name = fieldNames.find(([pattern]) => pattern.test(path))?.[1] ?? 'fitted';
  return { [name]: message };
}

function attempt<T>(work: () => T): { readonly answer: T } | { readonly error: InputError } {
  try {
    return { answer: work() };
  } catch (error) {
    if (error instanceof InputError) return { error };
    throw error;
  }
}
