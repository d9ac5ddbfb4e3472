import { units, type Kind, type Unit } from '../contracts/quantity.js';

const longestName = 40;

const pairs = (first: readonly string[], second: readonly string[], bothWays = true): string[] =>
  first.flatMap((a) => second.flatMap((b) => (bothWays ? [a + b, b + a] : [a + b])));

const poundForce = ['lbf', 'lb', 'lbs', 'lbsf', 'pound', 'pounds', 'poundforce'];
const kilogramForce = ['kgf', 'kg', 'kp', 'kilopond'];
const metre = ['metre', 'metres', 'meter', 'meters'];
const inch = ['in', 'ins', 'inch', 'inches'];
const foot = ['ft', 'foot', 'feet'];
const squareInch = ['in2', 'sqin', 'squareinch', 'squareinches'];

/** Spellings a workshop uses, written as they are after `squeeze`. Common practice, no source. */
const aliases: Record<Unit, readonly string[]> = {
  'N·m': ['Nm', ...pairs(['newton', 'N'], metre, false)],
  'lbf·ft': pairs(poundForce, foot),
  'lbf·in': pairs(poundForce, inch),
  'kgf·m': pairs(kilogramForce, ['m', ...metre]),
  'kgf·cm': pairs(kilogramForce, ['cm']),
  m: metre,
  cm: ['centimetre', 'centimetres', 'centimeter', 'centimeters'],
  mm: ['millimetre', 'millimetres', 'millimeter', 'millimeters'],
  µm: ['um', 'micron', 'microns', 'micrometre', 'micrometres', 'micrometer', 'micrometers'],
  in: [...inch, '"'],
  thou: ['thous', 'mil', 'mils'],
  ft: [...foot, "'"],
  mm2: ['sqmm', 'squaremillimetre', 'squaremillimetres'],
  cm2: ['sqcm', 'squarecentimetre', 'squarecentimetres'],
  in2: squareInch,
  N: ['newton', 'newtons'],
  kN: ['kilonewton', 'kilonewtons'],
  lbf: ['lbsf', 'poundforce', 'poundsforce'],
  kgf: ['kp', 'kilopond', 'kiloponds', 'kilogramforce'],
  Pa: ['pascal', 'pascals'],
  kPa: ['kilopascal', 'kilopascals'],
  MPa: ['MPA', 'Mpa', 'megapascal', 'megapascals', 'N/mm2'],
  bar: ['bars'],
  psi: [...pairs(['lbf/', 'lb/', 'lbs/'], squareInch, false)],
  m3: ['cubicmetre', 'cubicmetres', 'cubicmeter', 'cubicmeters'],
  l: ['L', 'ltr', 'litre', 'litres', 'liter', 'liters', 'dm3'],
  cm3: ['cc', 'ccs', 'ccm', 'ml', 'cucm', 'cubiccentimetre', 'cubiccentimetres'],
  mm3: ['cumm', 'cubicmillimetre', 'cubicmillimetres'],
  in3: ['cuin', 'cuins', 'cubicinch', 'cubicinches', 'cid'],
  '°C': ['C', 'degC', 'celsius', 'degreesC', 'degreescelsius'],
  '°F': ['F', 'degF', 'fahrenheit', 'degreesF', 'degreesfahrenheit'],
  K: ['kelvin', 'kelvins'],
  s: ['sec', 'secs', 'second', 'seconds'],
  min: ['mins', 'minute', 'minutes'],
  h: ['hr', 'hrs', 'hour', 'hours'],
  d: ['day', 'days'],
  Ω: ['ohm', 'ohms'],
  kΩ: ['kohm', 'kohms', 'kiloohm', 'kiloohms', 'kilohm', 'kilohms'],
  MΩ: ['Mohm', 'Mohms', 'MOhm', 'MOHM', 'megohm', 'megohms', 'megaohm', 'megaohms'],
  kg: ['kgs', 'kilo', 'kilos', 'kilogram', 'kilograms', 'kilogramme', 'kilogrammes'],
  g: ['gram', 'grams', 'gramme', 'grammes'],
  lb: ['lbs', 'lbm', 'pound', 'pounds'],
};

/** Takes out what only separates (`lbf·ft`, `ft-lb`, `N.m`, `cu in`) and makes look-alikes one character. */
function squeeze(text: string): string {
  return text
    .replace(/[º˚]/g, '°')
    .normalize('NFKC')
    .replace(/[\s·⋅•∙.\-‐‑‒–−*×_^]/g, '')
    .replace(/[′’‘]/g, "'")
    .replace(/[“”]|''/g, '"');
}

/** In these the case of a letter is the difference: MPa is not mPa, MΩ not mΩ. */
const caseMatters: ReadonlySet<Unit> = new Set(['MPa', 'MΩ']);

const exact = new Map<string, Unit>();
const anyCase = new Map<string, Unit>();
const kinds = new Map<Unit, Kind>();

for (const kind of Object.keys(units) as Kind[]) {
  for (const unit of units[kind]) {
    kinds.set(unit, kind);
    for (const name of [unit, ...aliases[unit]].map(squeeze)) {
      if (!exact.has(name)) exact.set(name, unit);
      const folded = name.toLowerCase();
      const isOpen = name.length > 1 && (!caseMatters.has(unit) || name.startsWith('meg'));
      if (isOpen && !anyCase.has(folded)) anyCase.set(folded, unit);
    }
  }
}

/**
 * The canonical unit that a workshop's spelling means, or undefined when it is none of ours.
 * `ft-lb` is a torque here, `lb` alone a mass. A single letter's case counts (`K`, `s`); of longer names
 * only where it would be another unit (`MPa`, `MΩ`).
 */
export function readUnit(text: string): Unit | undefined {
  if (typeof text !== 'string' || text.length > longestName) return undefined;
  const name = squeeze(text);
  return exact.get(name) ?? anyCase.get(name.toLowerCase());
}

/** The kind of a canonical unit, or undefined for anything else. */
export function kindOfUnit(unit: unknown): Kind | undefined {
  return kinds.get(unit as Unit);
}
