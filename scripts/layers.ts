/** `npm run layers`: fails where a module imports what its layer may not. */
import { checkLayers } from './layers/check.ts';
import { root } from './root.mjs';

const { modules, violations } = await checkLayers(root);
for (const violation of violations) console.error(violation);
console.log(`${modules} modules looked at, ${violations.length} violations.`);
if (modules === 0 || violations.length > 0) process.exitCode = 1;
