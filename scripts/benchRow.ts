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
