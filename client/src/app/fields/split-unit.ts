import type { Unit } from '@second-spanner/shared/contracts/quantity';
import { readUnit } from '@second-spanner/shared/quantities/unit-names';

export interface FigureAndUnit {
  readonly figure: string;
  /** The unit that is written behind the figure; none where there is none that a workshop knows. */
  readonly unit?: Unit;
}

const endsAsFigure = /[\d¼-¾⅐-⅞][.,]?$/;

/** Parts `27 lb ft` into `27` and `lbf·ft`. What has no known unit at its end is a figure as a whole. */
export function splitUnit(text: string): FigureAndUnit {
  for (let at = 1; at < text.length; at += 1) {
    const figure = text.slice(0, at).trim();
    const rest = text.slice(at).trim();
    const unit = endsAsFigure.test(figure) && !/^[\d.,/]/.test(rest) ? readUnit(rest) : undefined;
    if (unit !== undefined) return { figure, unit };
  }
  return { figure: text.trim() };
}

/** The other way round; no figure has no unit. */
export function joinUnit(figure: string, unit: Unit): string {
  return figure.trim() === '' ? '' : `${figure.trim()} ${unit}`;
}

/** A text as it is typed where its unit stands beside it: with that unit, unless one was typed, or no figure yet. */
export function withUnit(text: string, unit: Unit): string {
  const isFigureAlone = /\d|[¼-¾⅐-⅞]/.test(text) && !/[a-zµμ°ΩΩ"'’”′″]/i.test(text);
  return isFigureAlone ? joinUnit(text, unit) : text.trim();
}
