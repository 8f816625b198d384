import type { Parameter } from '../entry.ts';

/** The same parameter, which may be left out. */
export function optional<Read>(parameter: Parameter<Read>): Parameter<Read | undefined> {
  return { ...parameter, isOptional: true };
}

/** The same parameter, which may be given again and again together with its repeated neighbours. */
export function repeated<Read>(parameter: Parameter<Read>): Parameter<readonly Read[]> {
  return {
    ...parameter,
    isRepeated: true,
    read: (given, argument) => [parameter.read(given, argument)],
  };
}
