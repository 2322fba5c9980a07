import {
  createContext,
  type Dispatch,
  type ReactNode,
  useContext,
  useState,
  useSyncExternalStore,
} from "react";
import { type MoveAction, type MoveSettings, movesReducer, NO_MOVES } from "./moves.ts";

interface MovesStore {
  readonly get: () => MoveSettings;
  readonly dispatch: Dispatch<MoveAction>;
  readonly subscribe: (notify: () => void) => () => void;
}

/** Outside React's state: a context that changed with every move would render anew whatever bridges contexts. */
function createMovesStore(): MovesStore {
  let settings = NO_MOVES;
  const listeners = new Set<() => void>();
  return {
    get: () => settings,
    dispatch: (action) => {
      settings = movesReducer(settings, action);
      for (const notify of listeners) notify();
    },
    subscribe: (notify) => {
      listeners.add(notify);
      return () => listeners.delete(notify);
    },
  };
}

const MovesContext = createContext<MovesStore | null>(null);

/** Stands above the screens of a study, so that moves not yet applied outlive a tab. */
export function FlattenProvider({ children }: { children: ReactNode }) {
  const [store] = useState(createMovesStore);
  return <MovesContext.Provider value={store}>{children}</MovesContext.Provider>;
}

export function useMoves() {
  const store = useContext(MovesContext);
  if (!store) throw new Error("Moves are held by a FlattenProvider.");
  const settings = useSyncExternalStore(store.subscribe, store.get);
  return { settings, dispatch: store.dispatch };
}
