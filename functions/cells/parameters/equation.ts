import { balancedEquation, type CheckedReaction } from '../../chemistry/balancedEquation.ts';
import type { Parameter } from '../entry.ts';
import { text } from './text.ts';

/** A balanced equation; one that can be checked and does not balance is an error. */
export function equation(): Parameter<CheckedReaction> {
  const words = text('Reaction equation, such as "N2(g) + 3 H2(g) = 2 NH3(g)".');
  return { ...words, read: (given, argument) => balancedEquation(words.read(given, argument)) };
}
