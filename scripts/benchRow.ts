/** What a benchmark says: a ratio measured in one run, beside what it is to be. */
export interface Row {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly goal: string;
  readonly met: boolean;
}

export function atMost(goal: number, name: string, value: number, unit = 'times'): Row {
  return { name, value, unit, goal: `at most ${goal}`, met: value <= goal };
}

export function atLeast(goal: number, name: string, value: number, unit = 'times'): Row {
  return { name, value, unit, goal: `at least ${goal}`, met: value >= goal };
}

/** A figure to stand beside the others, without a goal of its own. */
export function forComparison(name: string, value: number, unit = 'times'): Row {
  return { name, value, unit, goal: 'for comparison', met: true };
}
