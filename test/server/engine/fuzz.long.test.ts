import { it } from 'vitest';
import { fuzzFormulas } from './fuzz.ts';

it('20,000 formulas made at random stay inside the host', () => fuzzFormulas(20_000, 7), 600_000);
