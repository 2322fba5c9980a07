// A value that changes many times a second and must not render React each time: whoever draws it listens.

export interface Channel<T> {
  readonly get: () => T;
  readonly set: (value: T) => void;
  /** Returns what stops the listening. */
  readonly subscribe: (listener: () => void) => () => void;
}

export function createChannel<T>(initial: T): Channel<T> {
  let current = initial;
  const listeners = new Set<() => void>();
  return {
    get: () => current,
    set: (value) => {
      if (Object.is(value, current)) return;
      current = value;
      for (const listener of listeners) listener();
    },
    subscribe: (listener) => {
      listeners.add(listener);
      return () => {
        listeners.delete(listener);
      };
    },
  };
}
