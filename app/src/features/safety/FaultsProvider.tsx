import type { Axle, Fault } from "@linkwright/kinematics";
import { createContext, type ReactNode, useContext } from "react";
import type { NamedBand } from "./reports.ts";
import { useFaults } from "./useFaults.ts";

const NONE: readonly Fault[] = [];
const FaultsContext = createContext<readonly Fault[]>(NONE);

interface FaultsProviderProps {
  readonly axle: Axle;
  readonly heights: readonly NamedBand[];
  readonly children: ReactNode;
}

/** Searches for faults once for everything that tells of them: the banner, the picture. */
export function FaultsProvider({ axle, heights, children }: FaultsProviderProps) {
  const faults = useFaults(axle, heights);
  return <FaultsContext.Provider value={faults ?? NONE}>{children}</FaultsContext.Provider>;
}

/** The open study's faults; none while they are still being searched for. */
export function useKnownFaults(): readonly Fault[] {
  return useContext(FaultsContext);
}
