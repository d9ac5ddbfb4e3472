import type { FontName } from './fonts.js';
import type { Pages } from './page.js';
import type { Paper } from './paper-size.js';

/** A caption over a value in the title block, and the points that they may take. */
export interface HeadCell {
  readonly caption: string;
  readonly value: string;
  readonly width: number;
  readonly font: FontName;
}

/** What stands the same on every page of a document, and what the file says of itself. */
export interface Frame {
  readonly paper: Paper;
  readonly title: string;
  readonly author: string;
  /** A fixed moment of the record, so that two renderings are the same to the byte. */
  readonly made: Date;
  readonly head: { readonly caption: string; readonly name: string; readonly cells: readonly HeadCell[] };
  /** Small print at the right of the foot, over the number of the page. */
  readonly note: string;
  /** Draws the left of a foot, 330 points wide, from a height on. */
  readonly foot: (pages: Pages, top: number) => void;
}

/** Whose paper it is, and whether what stands on it is invented. */
export const shopNote = ({
  shopName,
  demo,
}: {
  readonly shopName: string;
  readonly demo: boolean;
}): string => (demo ? `${shopName}. Demo: all data invented.` : shopName);
