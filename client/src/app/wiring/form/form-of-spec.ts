import type { SpecEdition } from '@second-spanner/shared/contracts/spec';
import { degrees } from '@second-spanner/shared/drawing/cap-input';
import { outletLetters } from './outlet-letters';
import { blankForm, type WiringForm } from './wiring-form';

/** The engine of a spec as a form, with nothing fitted. */
export function formOfSpec({ code, edition, document }: SpecEdition): WiringForm {
  const { engine, ignition, valveTrain } = document;
  const posts = ignition.posts.value;
  const trace = ignition.trace?.value;
  const keys = new Map(posts.map(({ post, angle }) => [post, degrees(angle)]));
  const keyOf = (post: string): string => keys.get(post) ?? '';
  const letters = outletLetters(posts.map(({ angle }) => angle));
  const isLettered = trace === undefined || posts.every(({ post }, i) => post === letters[i]);
  const timing = valveTrain.timing.value;
  return {
    ...blankForm,
    spec: code,
    edition: String(edition),
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
