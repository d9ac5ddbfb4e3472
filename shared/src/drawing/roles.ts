/** A colour as the page's token, as drawn in daylight on screen or colour paper, and in black and white. */
export interface Colour {
  readonly token: string;
  readonly day: string;
  readonly print: string;
}

/** Every colour a drawing may use. Lamp light changes the tokens only, so it has no column here. */
export const colours = {
  paper: { token: '--ss-paper', day: '#F8F9F5', print: '#FFFFFF' },
  plate: { token: '--ss-plate', day: '#FFFFFF', print: '#FFFFFF' },
  well: { token: '--ss-well', day: '#E3E7E2', print: '#E6E6E6' },
  ink: { token: '--ss-ink', day: '#15212C', print: '#000000' },
  'ink-2': { token: '--ss-ink-2', day: '#43515D', print: '#404040' },
  line: { token: '--ss-line', day: '#15212C', print: '#000000' },
  thin: { token: '--ss-thin', day: '#5C6A74', print: '#505050' },
  blue: { token: '--ss-blue', day: '#174A86', print: '#000000' },
  'on-blue': { token: '--ss-on-blue', day: '#FFFFFF', print: '#FFFFFF' },
  'blue-wash': { token: '--ss-blue-wash', day: '#DDE7F1', print: '#E6E6E6' },
  oxide: { token: '--ss-oxide', day: '#8A2C18', print: '#000000' },
  'on-oxide': { token: '--ss-on-oxide', day: '#FFFFFF', print: '#FFFFFF' },
  'oxide-wash': { token: '--ss-oxide-wash', day: '#F4E1DA', print: '#D9D9D9' },
  pass: { token: '--ss-pass', day: '#17503B', print: '#000000' },
  fail: { token: '--ss-fail', day: '#8A2C18', print: '#000000' },
  doubt: { token: '--ss-doubt', day: '#634500', print: '#000000' },
  wait: { token: '--ss-wait', day: '#43515D', print: '#404040' },
  hold: { token: '--ss-hold', day: '#15212C', print: '#000000' },
  'on-verdict': { token: '--ss-on-verdict', day: '#FFFFFF', print: '#FFFFFF' },
} as const satisfies Record<string, Colour>;

export type ColourRole = keyof typeof colours;

export interface PenStyle {
  readonly colour: ColourRole;
  /** Pixels on the page and points on paper, whatever the drawing's scale; drawing units where it scales. */
  readonly width: number;
  readonly dash?: readonly number[];
  /** Set on the pens of signs and marks alone, which must keep their shape at any size. */
  readonly scales?: true;
}

/** Line ends and joins are round, except on dashed lines, whose ends are cut. */
export const pens = {
  outline: { colour: 'line', width: 1.8 },
  edge: { colour: 'line', width: 1.1 },
  hidden: { colour: 'line', width: 0.9, dash: [4.5, 2.6] },
  dimension: { colour: 'line', width: 0.65 },
  thin: { colour: 'thin', width: 0.7 },
  centre: { colour: 'thin', width: 0.65, dash: [11, 2.5, 2, 2.5] },
  hatch: { colour: 'line', width: 0.55 },
  blue: { colour: 'blue', width: 1.6 },
  'blue-thin': { colour: 'blue', width: 0.9 },
  'blue-hidden': { colour: 'blue', width: 1.1, dash: [5, 3] },
  'on-blue': { colour: 'on-blue', width: 0.7 },
  oxide: { colour: 'oxide', width: 2.2 },
  'oxide-thin': { colour: 'oxide', width: 1.1 },
  'sign-blue': { colour: 'blue', width: 1.25, scales: true },
  'sign-doubt': { colour: 'doubt', width: 1.8, scales: true },
  'sign-wait': { colour: 'wait', width: 1.8, scales: true },
  'sign-ink': { colour: 'ink', width: 1.8, scales: true },
  'sign-on-verdict': { colour: 'on-verdict', width: 2.4, scales: true },
} as const satisfies Record<string, PenStyle>;

export type Pen = keyof typeof pens;

export const fills = [
  'paper',
  'plate',
  'well',
  'ink',
  'line',
  'blue',
  'blue-wash',
  'oxide',
  'oxide-wash',
  'pass',
  'fail',
  'doubt',
  'wait',
  'hold',
  'on-verdict',
] as const satisfies readonly ColourRole[];
export type Fill = (typeof fills)[number];

export const inks = [
  'ink',
  'ink-2',
  'blue',
  'oxide',
  'on-blue',
  'on-oxide',
] as const satisfies readonly ColourRole[];
export type Ink = (typeof inks)[number];

/** Text, plates (captions) and figures; the faces themselves belong to whoever draws. */
export const faces = {
  text: { token: '--ss-text', advance: 0.56 },
  plate: { token: '--ss-plate-face', advance: 0.5 },
  figures: { token: '--ss-fig', advance: 0.6 },
} as const;
export type Face = keyof typeof faces;

/** Width of the paper-coloured border round a text that crosses lines. */
export const haloWidth = 4;
