// The moves of Flatten, held beside the drawing until they are applied. Pure.

import {
  type Axle,
  applyMoves,
  type FlattenRequest,
  type FreeMove,
  type Move,
  type RideHeight,
  whyNotMove,
} from "@linkwright/kinematics";

export const OFFERED_MOVES = ["rackHeight", "rackForeAft", "innerWidth"] as const satisfies readonly Move[];
export type OfferedMove = (typeof OFFERED_MOVES)[number];

export interface MoveSetting {
  /** mm from where the drawing has it. */
  readonly mm: number;
  /** Whether the search may use it. */
  readonly isFree: boolean;
  /** How far the search may go; either end is 0 or on its own side of it. */
  readonly low: number;
  readonly high: number;
}

export type MoveSettings = Readonly<Record<OfferedMove, MoveSetting>>;

/** mm: room that a rack can usually be given on its brackets. */
const USUAL_BOUND = 25;
const AS_DRAWN: MoveSetting = { mm: 0, isFree: true, low: -USUAL_BOUND, high: USUAL_BOUND };

export const NO_MOVES: MoveSettings = {
  rackHeight: AS_DRAWN,
  rackForeAft: { ...AS_DRAWN, isFree: false },
  innerWidth: AS_DRAWN,
};

export type MoveAction =
  | { readonly type: "moved"; readonly move: OfferedMove; readonly mm: number }
  | { readonly type: "freedomChanged"; readonly move: OfferedMove; readonly isFree: boolean }
  | {
      readonly type: "boundChanged";
      readonly move: OfferedMove;
      readonly bound: "low" | "high";
      readonly mm: number;
    }
  | { readonly type: "answerTaken"; readonly moves: readonly { readonly move: Move; readonly mm: number }[] }
  | { readonly type: "putBack" };

export function movesReducer(settings: MoveSettings, action: MoveAction): MoveSettings {
  switch (action.type) {
    case "moved":
      return changed(settings, action.move, { mm: action.mm });
    case "freedomChanged":
      return changed(settings, action.move, { isFree: action.isFree });
    case "boundChanged": {
      // The drawn position always stays within the bounds.
      const mm = action.bound === "low" ? Math.min(0, action.mm) : Math.max(0, action.mm);
      return changed(settings, action.move, { [action.bound]: mm });
    }
    case "answerTaken":
      return OFFERED_MOVES.reduce((next, move) => {
        const found = action.moves.find((each) => each.move === move);
        return found ? changed(next, move, { mm: found.mm }) : next;
      }, settings);
    case "putBack":
      return OFFERED_MOVES.reduce((next, move) => changed(next, move, { mm: 0 }), settings);
  }
}

function changed(settings: MoveSettings, move: OfferedMove, change: Partial<MoveSetting>): MoveSettings {
  return { ...settings, [move]: { ...settings[move], ...change } };
}

/** What the parts allow: a move they forbid counts as not made. */
export function isMoved(axle: Axle, settings: MoveSettings): boolean {
  return OFFERED_MOVES.some((move) => mmOf(axle, settings, move) !== 0);
}

/** The drawing with the moves made; the very same while there are none. */
export function movedAxle(axle: Axle, settings: MoveSettings): Axle {
  const made = OFFERED_MOVES.filter((move) => mmOf(axle, settings, move) !== 0);
  return made.length === 0
    ? axle
    : applyMoves(
        axle,
        made,
        made.map((move) => settings[move].mm),
      );
}

/** mm between the points of a band that the search weighs. */
const SEARCH_STEP = 5;

export interface Search {
  /** The drawing as it was when this was asked. */
  readonly drawn: Axle;
  /** The drawing with the moves that stay as they were set by hand. */
  readonly axle: Axle;
  readonly request: FlattenRequest;
}

export function searchFor(axle: Axle, settings: MoveSettings, heights: readonly RideHeight[]): Search {
  const free = OFFERED_MOVES.filter((move) => settings[move].isFree && whyNotMove(axle, move) === null);
  const held = OFFERED_MOVES.reduce<MoveSettings>(
    (next, move) => (free.includes(move) ? changed(next, move, { mm: 0 }) : next),
    settings,
  );
  return {
    drawn: axle,
    axle: movedAxle(axle, held),
    request: {
      free: free.map((move): FreeMove => {
        const { low, high } = settings[move];
        return { move, low, high };
      }),
      heights,
      step: SEARCH_STEP,
    },
  };
}

function mmOf(axle: Axle, settings: MoveSettings, move: OfferedMove): number {
  return whyNotMove(axle, move) === null ? settings[move].mm : 0;
}
