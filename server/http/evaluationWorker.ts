/** The thread that evaluates for the server, so that a long evaluation does not hold up other requests. */
import { parentPort, workerData } from 'node:worker_threads';
import { isInputError } from '../../functions/errors.ts';
import { evaluateWorkbook } from '../engine/evaluateWorkbook.ts';
import { loadOwnFunctions } from '../ownFunctions.ts';
import type { Job, Reply, ThreadSetup } from './evaluationThreads.ts';

const { workbooks, ownFunctionsFile, timeLimitSeconds } = workerData as ThreadSetup;
const ownFunctions = ownFunctionsFile === null ? null : await loadOwnFunctions(ownFunctionsFile);

parentPort!.on('message', (job: Job) => parentPort!.postMessage(replyTo(job)));

function replyTo({ name, given }: Job): Reply {
  try {
    const options = { given, ownFunctions, timeLimitSeconds };
    return { evaluation: evaluateWorkbook(workbooks.get(name)!, options) };
  } catch (thrown) {
    if (!isInputError(thrown)) throw thrown;
    return { error: { code: thrown.code, message: thrown.message } };
  }
}
