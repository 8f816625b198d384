/** The project's folder. */
import { dirname } from 'node:path';

export const root = dirname(import.meta.dirname);
