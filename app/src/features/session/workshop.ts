import { type Action, type Me, may, maySettleComment, type Role } from "@linkwright/contract";
import { createContext, useContext } from "react";

export interface Workshop {
  readonly workshopId: string;
  readonly workshopName: string;
  readonly role: Role;
  readonly may: (action: Action) => boolean;
  readonly maySettleComment: (isOwn: boolean) => boolean;
  /** Another of the person's workshops becomes the one that is looked at. */
  readonly choose: (workshopId: string) => void;
}

export const PersonContext = createContext<Me | null>(null);
export const WorkshopContext = createContext<Workshop | null>(null);

export function buildWorkshop(
  me: Me,
  chosenId: string | null,
  choose: (workshopId: string) => void,
): Workshop | null {
  const membership = me.memberships.find(({ workshopId }) => workshopId === chosenId) ?? me.memberships[0];
  if (!membership) return null;
  const { role } = membership;
  return {
    ...membership,
    choose,
    may: (action) => may(role, action),
    maySettleComment: (isOwn) => maySettleComment(role, isOwn),
  };
}

/** Whoever is signed in. Only below the session's gate. */
export function useCurrentPerson(): Me {
  const me = useContext(PersonContext);
  if (!me) throw new Error("useCurrentPerson needs the SessionGate above it.");
  return me;
}

/** The workshop that is looked at, and what the person may do in it. Only below the session's gate. */
export function useWorkshop(): Workshop {
  const workshop = useContext(WorkshopContext);
  if (!workshop) throw new Error("useWorkshop needs the SessionGate above it.");
  return workshop;
}
