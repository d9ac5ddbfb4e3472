/** The short texts of a wiring map's case as they read to a person. What is not written so stays as it is. */

/** `45:C,135:D` as `45° to C, 135° to D`. */
export const sayTrace = (text: string): string => sayPairs(text, (post, outlet) => `${post}° to ${outlet}`);

/** `45:C,135:D` as `C at 45°, D at 135°`. */
export const sayBeside = (text: string): string => sayPairs(text, (post, outlet) => `${outlet} at ${post}°`);

/** `A:1,45:2` as `A to No. 1, 45° to No. 2`: an outlet is a letter, or the angle of its post. */
export const sayFitted = (text: string): string =>
  sayPairs(
    text,
    (outlet, cylinder) => `${degreesOf(outlet)} to ${/^\d+$/.test(cylinder) ? 'No. ' : ''}${cylinder}`,
  );

/** `45, 135` as `45°, 135°`. */
export const sayAngles = (text: string): string =>
  text
    .split(/\s*,\s*/)
    .map(degreesOf)
    .join(', ');

/** `16_56_51_21` in the words of the four events. */
export function sayValves(text: string): string {
  const events = ['{inlet} opens', '{inlet} closes', 'exhaust opens', 'exhaust closes'];
  const ends = ['before TDC', 'after BDC', 'before BDC', 'after TDC'];
  return text
    .split('_')
    .map((figure, i) =>
      figure === '' ? '' : `${events[i] ?? ''} ${degreesOf(figure)} ${ends[i] ?? ''}`.trim(),
    )
    .filter((words) => words !== '')
    .join(', ');
}

export const sayView = (text: string): string =>
  text === 'drive' ? 'the drive side' : 'the outside of the cap';

const degreesOf = (text: string): string => (/^[-−]?[\d.]+$/.test(text) ? `${text}°` : text);

function sayPairs(text: string, say: (name: string, value: string) => string): string {
  return text
    .split(',')
    .map((pair) => {
      const [name = '', value = ''] = pair.split(':').map((part) => part.trim());
      return value === '' ? name : say(name, value);
    })
    .join(', ');
}
