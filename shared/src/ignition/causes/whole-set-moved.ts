import { turnBetween } from '../cap-posts.js';
import { spacingTolerance } from '../post-spacing.js';
import { lateBy } from '../spark-position.js';
import { counted, degrees, isWholeTurn, lateness, listed, named } from '../words.js';
import type { Wiring } from '../wiring.js';
import type { Cause } from './cause.js';

/** The set is right in itself, and every lead is the same number of posts from its own. */
export const wholeSetMoved: Cause = {
  title: 'Whole set moved',
  fits: (wiring) => movedBy(wiring) !== null,
  explain: (wiring) => {
    const k = movedBy(wiring) ?? 0;
    return [whereItStands(wiring, k), whatComesOfIt(wiring), cure(wiring, k)].join(' ');
  },
};

/** By how many posts, 1 to n − 1 the way the rotor turns, the whole set is moved; null if it is not. */
export function movedBy({ belongs }: Wiring): number | null {
  const n = belongs.length;
  const k = belongs.indexOf(0);
  return k > 0 && belongs.every((place, i) => place === (i - k + n) % n) ? k : null;
}

function whereItStands({ leads }: Wiring, k: number): string {
  const [first] = leads;
  const where =
    first === undefined
      ? ''
      : `: the lead of cylinder ${named(first.cylinder)} is on post ${named(first.on.post)} ` +
        `and belongs on post ${named(first.own.post)}`;
  return `The leads are in the right order, but the whole set stands ${counted(k, 'post')} on in the rotor’s direction${where}.`;
}

function whatComesOfIt(wiring: Wiring): string {
  const late = lateOfAll(wiring);
  if (late !== null && isWholeTurn(late)) {
    return (
      'Every spark comes 360° of crank out, at the end of the exhaust stroke: ' +
      'the distributor, or the crank when it was set, is a full crank turn out.'
    );
  }
  if (late !== null) return `Every spark comes ${lateness(late)}, in degrees of crank.`;
  const each = wiring.leads.map((lead) => `cylinder ${named(lead.cylinder)} ${lateness(lead.late)}`);
  return `The engine fires unevenly, so the sparks come differently wrong: ${listed(each)}.`;
}

function cure(wiring: Wiring, k: number): string {
  const n = wiring.belongs.length;
  const back = `${counted(k, 'post')} back, against the rotor`;
  const on = `${counted(n - k, 'post')} on, with the rotor`;
  const [short, long] = k <= n / 2 ? [back, on] : [on, back];
  const leads = `Move every lead ${short} (${long}, is the same).`;
  const turn = turnOfAll(wiring);
  if (turn === null) {
    return `${leads} The posts or the sparks are unevenly spaced, so turning the distributor does not cure it.`;
  }
  const seen = wiring.leads[0];
  const look =
    seen === undefined
      ? ''
      : ` Before moving anything, bring cylinder ${named(seen.cylinder)} to its firing point on compression: ` +
        `if the rotor then points to post ${named(seen.on.post)}, the leads suit the drive as it stands.`;
  return `${leads} Or leave the leads and turn the distributor instead: ${turning(turn)}.${look}`;
}

/** @param turn degrees of distributor by which the set stands on, the way the rotor turns */
function turning(turn: number): string {
  if (Math.abs(turn - 180) <= spacingTolerance) {
    return 'its drive half a turn, either way, or its body half a turn where that has the room';
  }
  const against = turn < 180;
  const angle = degrees(against ? turn : 360 - turn);
  const [body, drive] = against ? ['against', 'with'] : ['with', 'against'];
  return `its body ${angle} ${body} the way the rotor turns, where it has the room, or its drive ${angle} ${drive} it`;
}

/** What every spark is late by, if it is the same for all; else null. */
function lateOfAll({ leads }: Wiring): number | null {
  const late = leads[0]?.late ?? 0;
  const same = leads.every((lead) => Math.abs(lateBy(lead.late, late)) <= 2 * spacingTolerance);
  return same ? late : null;
}

/**
 * How far the whole set stands on from its own posts, degrees of distributor the way the rotor turns; null if
 * it is not the same for all in posts and in sparks, for then no turn of the distributor cures it.
 */
function turnOfAll(wiring: Wiring): number | null {
  const { leads, cap } = wiring;
  const late = lateOfAll(wiring);
  const turns = leads.map(({ own, on }) => turnBetween(own.angle, on.angle, cap.rotation));
  const [turn] = turns;
  if (turn === undefined || late === null) return null;
  const sameTurn = turns.every((one) => Math.abs(one - turn) <= spacingTolerance);
  const sameAsLate = Math.abs(lateBy(2 * turn, late)) <= 2 * spacingTolerance;
  return sameTurn && sameAsLate ? turn : null;
}
