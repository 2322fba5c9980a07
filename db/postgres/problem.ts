/** A problem with the database server that the person at the keyboard can mend: shown as its message alone. */
export class PostgresProblem extends Error {
  override name = "PostgresProblem";
}
