import { CAUTIONS_EDITION, type ChangeMeRequest, type Me, type SignUpRequest } from "@linkwright/contract";
import { asPerson, type Db, inWorkshop, type Tx } from "@linkwright/db";
import { ServiceError } from "../../http/problems.ts";
import { alreadySignedUpMessage, type MailSettings, postMail, welcomeMessage } from "../../mail/index.ts";
import { hashPassword, passwordFits } from "./passwords.ts";
import {
  addMembership,
  addPerson,
  addWorkshop,
  changePerson,
  findPerson,
  findPersonByEmail,
  listMemberships,
  type PersonRow,
} from "./repo.ts";

export interface AuthOptions {
  readonly db: Db;
  readonly mail: MailSettings;
}

export type AuthService = ReturnType<typeof createAuthService>;

export function createAuthService(options: AuthOptions) {
  const { db } = options;
  return {
    signUp: (request: SignUpRequest) => signUp(options, request),
    getMe: (personId: string) => getMe(db, personId),
    changeMe: (personId: string, change: ChangeMeRequest) => changeMe(db, personId, change),
  };
}

/**
 * Makes a person, their workshop and the welcome mail, or nothing. The answer and the time it takes are the same for
 * an address that has an account already: only its owner learns of it, by mail.
 */
async function signUp({ db, mail }: AuthOptions, request: SignUpRequest): Promise<void> {
  const passwordHash = await hashPassword(request.password);
  await inWorkshop(db, request.workshopId, async ({ tx }) => {
    if (await addAccount(tx, mail, request, passwordHash)) return;
    const known = await findPersonByEmail(tx, request.email);
    if (known === null) throw new ServiceError("id_reused");
    // The same sign-up sent again after a lost answer has nothing left to do.
    if (known.id !== request.personId) await postMail(tx, mail, alreadySignedUpMessage(known, mail));
  });
}

/** False when the person's id or address is taken. */
async function addAccount(
  tx: Tx,
  mail: MailSettings,
  request: SignUpRequest,
  passwordHash: string,
): Promise<boolean> {
  const { personId, workshopId, name, email, workshopName } = request;
  const isNew = await addPerson(tx, {
    id: personId,
    email,
    name,
    passwordHash,
    cautionsAcknowledgedAt: new Date(),
    cautionsEdition: CAUTIONS_EDITION,
  });
  if (!isNew) return false;
  if (!(await addWorkshop(tx, { id: workshopId, name: workshopName }))) throw new ServiceError("id_reused");
  await addMembership(tx, { workshopId, personId, role: "owner" });
  await postMail(tx, mail, welcomeMessage({ name, email }, workshopName, mail));
  return true;
}

/** The person's id, or null: never which of the two was wrong. */
export async function verifyCredentials(
  db: Db,
  { email, password }: { email: string; password: string },
): Promise<string | null> {
  const person = await findPersonByEmail(db, email);
  const fits = await passwordFits(person?.passwordHash ?? null, password);
  return person && fits ? person.id : null;
}

function getMe(db: Db, personId: string): Promise<Me> {
  return asPerson(db, personId, async (scope) => {
    const person = await findPerson(scope.tx, personId);
    // A session can outlive its person.
    if (person === null) throw new ServiceError("not_signed_in");
    return presentMe(person, await listMemberships(scope));
  });
}

async function changeMe(db: Db, personId: string, change: ChangeMeRequest): Promise<Me> {
  if (Object.keys(change).length > 0) {
    await asPerson(db, personId, ({ tx }) => changePerson(tx, personId, change));
  }
  return getMe(db, personId);
}

function presentMe(person: PersonRow, memberships: Me["memberships"]): Me {
  const { id, name, email, units, dialect, theme } = person;
  return { id, name, email, preferences: { units, dialect, theme }, memberships };
}
