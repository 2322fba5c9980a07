import { type Axle, formatPath, listHardpoints, type Path } from "@linkwright/kinematics";
import { capitalise, type DialectWord } from "@/lib/dialect.ts";

type Words = Readonly<Record<DialectWord, string>>;

/** The engine's names for parts that are called differently on either side of the Atlantic. */
const DIALECT_GROUPS: Readonly<Record<string, DialectWord>> = {
  "Tie rod": "tieRod",
  "Anti-roll bar": "antiRollBar",
};

/** "Track rod, inner joint, left". */
export function hardpointInWords(axle: Axle, hardpoint: string, words: Words): string {
  const found = listHardpoints(axle).find(({ path }) => path === hardpoint);
  if (!found) return hardpoint;
  return `${groupInWords(found.group, words)}, ${found.label}, ${found.side}`;
}

export function groupInWords(group: string, words: Words): string {
  const word = DIALECT_GROUPS[group];
  return word === undefined ? group : capitalise(words[word]);
}

/** A place of the study document for people: hardpoints by name, the rest by its path. */
export function pathInWords(axle: Axle, path: Path, words: Words): string {
  const inAxle = path[0] === "axle" ? path.slice(1) : path;
  const hardpoint = inAxle.join(".");
  const named = hardpointInWords(axle, hardpoint, words);
  return named === hardpoint ? formatPath(inAxle) : named;
}
