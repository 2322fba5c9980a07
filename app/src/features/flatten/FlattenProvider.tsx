import { createContext, type Dispatch, type ReactNode, useContext, useMemo, useReducer } from "react";
import { type MoveAction, type MoveSettings, movesReducer, NO_MOVES } from "./moves.ts";

interface MovesHandle {
  readonly settings: MoveSettings;
  readonly dispatch: Dispatch<MoveAction>;
}

const MovesContext = createContext<MovesHandle | null>(null);

/** Stands above the screens of a study, so that moves not yet applied outlive a tab. */
export function FlattenProvider({ children }: { children: ReactNode }) {
  const [settings, dispatch] = useReducer(movesReducer, NO_MOVES);
  const handle = useMemo(() => ({ settings, dispatch }), [settings]);
  return <MovesContext.Provider value={handle}>{children}</MovesContext.Provider>;
}

export function useMoves(): MovesHandle {
  const handle = useContext(MovesContext);
  if (!handle) throw new Error("Moves are held by a FlattenProvider.");
  return handle;
}
