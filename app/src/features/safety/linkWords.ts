import type { DialectWord } from "@/lib/dialect.ts";

const PARTS: Readonly<Record<string, string>> = {
  lowerArm: "lower arm",
  upperArm: "upper arm",
  frontPivot: "front pivot",
  rearPivot: "rear pivot",
};

/** `upperArm.frontPivot` → "upper arm, front pivot"; what is not known is spelt out from its name. */
export function linkInWords(link: string, words: Readonly<Record<DialectWord, string>>): string {
  return link
    .split(".")
    .map((part) => {
      if (part === "tieRod") return words.tieRod;
      return PARTS[part] ?? part.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
    })
    .join(", ");
}
