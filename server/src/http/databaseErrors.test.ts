import { describe, expect, test } from "vitest";
import { isDatabaseAway, postgresCode } from "./databaseErrors.ts";

const coded = (code: string) => Object.assign(new Error("x"), { code });

describe("the database is away", () => {
  test.each([
    ["connection refused", coded("ECONNREFUSED")],
    ["shut down by its operator", coded("57P01")],
    ["not yet open for connections", coded("57P03")],
    ["no connections left", coded("53300")],
    ["disk full", coded("53100")],
    ["connection lost", coded("08006")],
    ["no connection in time", new Error("timeout exceeded when trying to connect")],
    ["cut while a query ran", new Error("Connection terminated unexpectedly")],
    ["wrapped by whoever ran the query", new Error("Failed query", { cause: coded("ECONNRESET") })],
    ["refused on every address", new AggregateError([coded("ECONNREFUSED"), coded("ECONNREFUSED")])],
  ])("when it is %s", (_name, error) => {
    expect(isDatabaseAway(error)).toBe(true);
  });

  test.each([
    ["a broken rule", coded("23505")],
    ["a wrong query", coded("42601")],
    ["a fault of ours", new Error("undefined is not a function")],
    ["nothing that is an error", "text"],
  ])("but not after %s", (_name, error) => {
    expect(isDatabaseAway(error)).toBe(false);
  });
});

test("PostgreSQL's code is found however deep it lies, and no other code is taken for it", () => {
  expect(postgresCode(new Error("a", { cause: new Error("b", { cause: coded("23505") }) }))).toBe("23505");
  expect(postgresCode(coded("ECONNRESET"))).toBeNull();
});
