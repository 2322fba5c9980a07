import { cssClass } from "./dom.tsx";
import { Text } from "./Text.tsx";

/** Heard by screen readers, not seen. */
export function HiddenText({ children }: { children: string }) {
  return <Text style={cssClass("visually-hidden")}>{children}</Text>;
}
