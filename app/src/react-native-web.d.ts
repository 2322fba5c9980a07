declare module "react-native-web" {
  import type { ReactElement } from "react";
  /** Makes a DOM element that takes React Native style arrays. */
  export function unstable_createElement(tag: string, props: object): ReactElement;
}
