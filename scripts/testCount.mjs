/** Prints how many tests passed and failed, from the file that the JSON reporter of vitest wrote. */
import { readFileSync } from 'node:fs';

const [, , file = ''] = process.argv;
const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(file, 'utf8'));
console.log(`${numPassedTests} passed, ${numFailedTests} failed`);
