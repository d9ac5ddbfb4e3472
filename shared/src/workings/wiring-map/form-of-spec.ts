import type { SpecDocument, SpecEdition } from '../../contracts/spec.js';
import { degrees } from '../../drawing/cap-input.js';
import { outletLetters } from './outlet-letters.js';
import { blankForm, type WiringForm } from './wiring-form.js';

/** The engine of an edition as a form that names it, with nothing fitted. */
export function formOfSpec({ code, edition, document }: SpecEdition): WiringForm {
  return { ...formOfDocument(document), spec: code, edition: String(edition) };
}

/** The engine of a spec as a form, with nothing fitted. */
export function formOfDocument({ engine, ignition, valveTrain }: SpecDocument): WiringForm {
  const posts = ignition.posts.value;
  const trace = ignition.trace?.value;
  const keys = new Map(posts.map(({ post, angle }) => [post, degrees(angle)]));
  const keyOf = (post: string): string => keys.get(post) ?? '';
  const letters = outletLetters(posts.map(({ angle }) => angle));
  const isLettered = trace === undefined || posts.every(({ post }, i) => post === letters[i]);
  const timing = valveTrain.timing.value;
  return {
    ...blankForm,
    cylinders: String(engine.cylinders.value),
    order: engine.firingOrder.value.join('-'),
    turns: ignition.rotation.value,
    seenFrom: ignition.rotationSeenFrom.value,
    spacing: 'typed',
    firstAngle: blankForm.firstAngle,
    angles: posts.map(({ angle }) => String(angle)).join(', '),
    first: keyOf(ignition.firstPost.value),
    outlets: trace === undefined ? 'own' : 'traced',
    trace: Object.fromEntries(Object.entries(trace ?? {}).map(([post, outlet]) => [keyOf(post), outlet])),
    beside: isLettered ? {} : Object.fromEntries(posts.map(({ post }) => [keyOf(post), post])),
    advance: String(ignition.staticTiming.value),
    ivo: String(timing.ivo),
    ivc: String(timing.ivc),
    evo: String(timing.evo),
    evc: String(timing.evc),
  };
}
