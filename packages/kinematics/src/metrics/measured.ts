// A quantity that may have no value where it is asked for, and then says why.

export type Measured = { readonly value: number } | { readonly value: null; readonly because: string };

export function measured(value: number): Measured {
  return { value };
}

export function unmeasured(because: string): Measured {
  return { value: null, because };
}
