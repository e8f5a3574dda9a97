/** States in the order in which they were, and which of them stands now. */
export interface History<T> {
  readonly states: readonly T[];
  readonly at: number;
}

const MOST = 200;

export const beginning = <T>(state: T): History<T> => ({ states: [state], at: 0 });

/**
 * The history once a state has come to stand, by whatever way: a step back or forth is one, with the
 * page's buttons as with the browser's; anything else is new and ends what could be redone.
 */
export function follow<T extends string>({ states, at }: History<T>, state: T): History<T> {
  if (states[at] === state) return { states, at };
  if (states[at - 1] === state) return { states, at: at - 1 };
  if (states[at + 1] === state) return { states, at: at + 1 };
  const kept = [...states.slice(0, at + 1), state].slice(-MOST);
  return { states: kept, at: kept.length - 1 };
}
