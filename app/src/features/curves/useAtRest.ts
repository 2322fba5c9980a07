import { useEffect, useState } from "react";

/** The end of a drag, not a slow frame within it: without a graphics card a frame takes well over 100 ms. */
const REST_MS = 250;

/** A value once it has rested: for what need not follow every frame of a drag and would only slow it. */
export function useAtRest<Value>(value: Value): Value {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const rest = setTimeout(() => setRested(value), REST_MS);
    return () => clearTimeout(rest);
  }, [value]);
  return rested;
}
