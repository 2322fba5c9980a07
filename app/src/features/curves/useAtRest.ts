import { useEffect, useState } from "react";

/** Two frames and a bit: the end of a drag, not a pause within it. */
const REST_MS = 120;

/** A value once it has rested: for what need not follow every frame of a drag and would only slow it. */
export function useAtRest<Value>(value: Value): Value {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const rest = setTimeout(() => setRested(value), REST_MS);
    return () => clearTimeout(rest);
  }, [value]);
  return rested;
}
