// What the person gave cannot be used: told in full on stderr, exit 2.

export class BadInput extends Error {
  readonly lines: readonly string[];

  constructor(lines: readonly string[]) {
    super(lines.join("\n"));
    this.name = "BadInput";
    this.lines = lines;
  }
}
