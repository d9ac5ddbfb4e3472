import type { TighteningPass } from '../../contracts/calculations.js';
import { InputError } from '../../contracts/input-error.js';
import { parseQuantity } from '../../quantities/parse.js';
import { requireQuantity } from '../../quantities/require.js';
import { typed } from './figures.js';

/** What is taken where no passes are typed: common practice, no source. */
export const usualPasses: readonly TighteningPass[] = [{ fraction: 0.5 }, { fraction: 1 }];

/**
 * A pass as it is typed: `50 %`, `30 N·m`, `60°`, `check`.
 *
 * @throws InputError on `field`
 */
export function readPass(text: string, field: string): TighteningPass {
  const plain = text.trim().toLowerCase();
  if (plain === 'check') return { check: true };
  const [, figure = '', sign] = /^(\d{1,4}(?:[.,]\d{1,6})?) ?(%|°|deg(?:rees)?)$/.exec(plain) ?? [];
  const number = Number(figure.replace(',', '.'));
  if (sign === '%') {
    if (number === 0 || number > 100) throw new InputError(field, 'Write more than 0 % and at most 100 %.');
    return { fraction: number / 100 };
  }
  if (sign !== undefined) {
    if (number === 0 || number > 360) throw new InputError(field, 'Write more than 0° and at most 360°.');
    return { angle: number };
  }
  if (!/[a-z]/.test(plain)) {
    throw new InputError(field, 'Write it like 50 %, 30 N·m, 60° or check.');
  }
  return { torque: requireTorque(text, field) };
}

function requireTorque(text: string, field: string): ReturnType<typeof parseQuantity> {
  try {
    return requireQuantity(parseQuantity(text, undefined, field), 'torque', field, { zero: false });
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(field, `${error.message} A pass is written like 50 %, 30 N·m, 60° or check.`);
  }
}

/** A pass as it would be typed. */
export function writePass(pass: TighteningPass): string {
  if ('torque' in pass) return typed(pass.torque);
  if ('angle' in pass) return `${pass.angle}°`;
  return 'check' in pass ? 'check' : `${Number((pass.fraction * 100).toPrecision(8))} %`;
}

/** A pass in words: `to 50 %`, `60° further`. */
export function passInWords(pass: TighteningPass): string {
  if ('angle' in pass) return `${pass.angle}° further`;
  if ('check' in pass) return 'check all once more';
  return `to ${writePass(pass)}`;
}
