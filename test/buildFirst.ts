/** Run before the tests of what is built. */
export { buildIfStale as setup } from '../scripts/build.mjs';
