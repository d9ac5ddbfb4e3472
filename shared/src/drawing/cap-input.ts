import type {
  CapDiagnosis,
  CapMap,
  CapMapRequest,
  CapMapRow,
  Cylinder,
  Rotation,
} from '../contracts/calculations.js';
import { traced, type CapSides, type PlacedLead } from './cap-layout.js';

export interface CapDrawingInput {
  readonly map: Pick<CapMap, 'rows'>;
  readonly request: Pick<CapMapRequest, 'rotation' | 'rotationSeenFrom'>;
  /** Which cylinder's lead is in which post or outlet, as far as it has been entered. */
  readonly fitted?: Readonly<Record<string, Cylinder>>;
  /** What `fitted` is keyed by; posts by default, as in the diagnosis request. */
  readonly fittedBy?: 'post' | 'outlet';
  readonly diagnosis?: Pick<CapDiagnosis, 'swaps'>;
  /** False while what is fitted is being entered: then nothing shows what ought to be. */
  readonly showRequired: boolean;
  /** Where the rotor was seen to point, clockwise from the mark; by default it points at the first cylinder's post. */
  readonly rotorAngle?: number;
  /** The outlet being asked about while entering. */
  readonly inHand?: string;
  /** How a side-outlet cap's outlets lie; by default in order of name, down the left and then the right. */
  readonly sides?: CapSides;
}

/** What stands at one outlet. */
export interface LeadState {
  readonly cylinder: Cylinder | undefined;
  readonly wrong: boolean;
  readonly inHand: boolean;
}

export interface LeadHere extends PlacedLead {
  readonly state: LeadState;
  /** The name by which the outlet is called: its own on a traced cap, its post's angle on any other. */
  readonly name: string;
  /** Whether that name is drawn on the outlet. */
  readonly lettered: boolean;
  /** Where this lead belongs, if it is wrong and belongs on this cap. */
  readonly moveTo?: string;
}

/** Rotation as seen on the cap, where the leads plug in. */
export function rotationOnCap(request: Pick<CapMapRequest, 'rotation' | 'rotationSeenFrom'>): Rotation {
  if (request.rotationSeenFrom !== 'drive') {
    return request.rotation;
  }
  return request.rotation === 'clockwise' ? 'anticlockwise' : 'clockwise';
}

/** Says of every placed lead what is fitted there, and whether and where it must go. */
export function leadsHere(placed: readonly PlacedLead[], input: CapDrawingInput): readonly LeadHere[] {
  const lettered = traced(placed.map(({ row }) => row));
  const nameOf = ({ outlet, angle }: CapMapRow): string => (lettered ? outlet : `${degrees(angle)}°`);
  return placed.map((one) => {
    const state = stateOf(one.row, input);
    const home = placed.find(({ row }) => row.cylinder === state.cylinder);
    const moveTo = state.wrong && home !== undefined ? nameOf(home.row) : undefined;
    return { ...one, state, name: nameOf(one.row), lettered, moveTo };
  });
}

function stateOf(row: CapMapRow, input: CapDrawingInput): LeadState {
  const inHand = input.inHand === row.outlet;
  if (input.fitted === undefined) {
    return { cylinder: input.showRequired ? row.cylinder : undefined, wrong: false, inHand };
  }
  const cylinder = input.fitted[input.fittedBy === 'outlet' ? row.outlet : row.post];
  const wrong = input.showRequired && cylinder !== undefined && String(cylinder) !== String(row.cylinder);
  return { cylinder, wrong, inHand };
}

/** An angle, 0 to 360, without needless decimals. */
export function degrees(angle: number): string {
  return String(Math.round((((angle % 360) + 360) % 360) * 10) / 10);
}
