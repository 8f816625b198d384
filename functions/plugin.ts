/**
 * Registers the catalogue with a formula engine, the caller's own copy of HyperFormula.
 *
 * The engine's module and CommonJS builds do not know each other's classes, so nothing of the
 * engine but its types is imported here: the caller hands over the build that it uses. Of the
 * functions this file and the folder of its name alone know the engine.
 */
import type { CellError } from 'hyperformula';
import { catalogue } from './catalogue.ts';
import { answerShape, callFunction } from './cells/call.ts';
import type { CellFunction, CellValue, Shape } from './cells/entry.ts';
import { InputError, inputError, isInputError } from './errors.ts';
import { type CellPlace, recorderOf } from './plugin/recorder.ts';
import { type EngineModule, engineValue, plainParts, readArgument } from './plugin/values.ts';

export type { CallRecorder, CellPlace } from './plugin/recorder.ts';
export type { EngineModule } from './plugin/values.ts';

/** What has been registered with each engine module, so that registering again is harmless. */
const registered = new WeakMap<object, Map<string, CellFunction>>();

/**
 * Makes every function of the catalogue, and the analyst's own, known to the engine. Call it before
 * an engine is built; calling it again with the same functions changes nothing.
 *
 * `registerEvenkeel(await import('hyperformula'))`
 *
 * Errors: a name that the engine or the catalogue already has (`function-name-taken`).
 */
export function registerEvenkeel(engine: EngineModule, ownFunctions: readonly CellFunction[] = []): void {
  const { HyperFormula } = engine;
  const ours = registered.get(HyperFormula) ?? new Map<string, CellFunction>();
  registered.set(HyperFormula, ours);
  const entries = [...catalogue, ...ownFunctions];
  const fresh = entries.filter((entry) => ours.get(entry.name) !== entry);
  const taken = new Set(HyperFormula.getRegisteredFunctionNames(LANGUAGE));
  for (const { name } of fresh) {
    if (taken.has(name)) throw inputError('function-name-taken', { name });
    taken.add(name);
  }
  if (fresh.length === 0) return;
  const plugin = pluginClass(plainParts(engine), fresh, new Map(entries.map((entry) => [entry.name, entry])));
  const translations = Object.fromEntries(fresh.map(({ name }) => [name, name]));
  HyperFormula.registerFunctionPlugin(plugin, { [LANGUAGE]: translations });
  for (const entry of fresh) ours.set(entry.name, entry);
}

/** The engine's built-in language; without a translation of its name a function is unknown to it. */
const LANGUAGE = 'enGB';

/* The engine's own types for syntax nodes and interpreter state are not exported; these are the parts used. */
interface SyntaxNode {
  readonly type: string;
  readonly procedureName?: string;
  readonly args: readonly SyntaxNode[];
}
interface InterpreterState {
  readonly formulaAddress: CellPlace;
}
interface EngineArraySize {
  readonly width: number;
  readonly height: number;
}
interface PluginInstance {
  readonly config: { readonly context: unknown };
  evaluateAst(node: SyntaxNode, state: InterpreterState): unknown;
  arraySizeForAst(node: SyntaxNode, state: object): EngineArraySize;
}

function pluginClass(
  engine: EngineModule,
  entries: readonly CellFunction[],
  byName: ReadonlyMap<string, CellFunction>,
) {
  const { ArraySize, FunctionPlugin } = engine;

  class EvenkeelPlugin extends FunctionPlugin {
    static override implementedFunctions = Object.fromEntries(
      entries.map((entry) => [
        entry.name,
        {
          method: entry.name,
          vectorizationForbidden: true,
          enableArrayArithmeticForArguments: true,
          ...(entry.shape && { sizeOfResultArrayMethod: sizeMethod(entry.name) }),
        },
      ]),
    );
  }

  /** The size known from the syntax alone; a nested table function also tells how its table lies. */
  const shapeOf = (plugin: PluginInstance, node: SyntaxNode, state: object): Shape | undefined => {
    if (node.type === 'EMPTY') return undefined;
    const entry = node.type === 'FUNCTION_CALL' ? byName.get(node.procedureName!) : undefined;
    if (entry !== undefined) {
      const shapes = node.args.map((argument) => shapeOf(plugin, argument, state));
      return answerShape(entry, shapes);
    }
    const { width, height } = plugin.arraySizeForAst(node, { ...state, arraysFlag: true });
    return { rows: height, columns: width };
  };

  for (const entry of entries) {
    Object.defineProperties(EvenkeelPlugin.prototype, {
      [entry.name]: {
        value(this: PluginInstance, node: SyntaxNode, state: InterpreterState) {
          return work(engine, this, entry, node, state, () => shapeOf(this, node, state) ?? ONE_CELL);
        },
      },
      [sizeMethod(entry.name)]: {
        value(this: PluginInstance, node: SyntaxNode, state: object) {
          const { rows, columns } = shapeOf(this, node, state) ?? ONE_CELL;
          return new ArraySize(columns, rows);
        },
      },
    });
  }
  return EvenkeelPlugin;
}

const ONE_CELL: Shape = { rows: 1, columns: 1 };

function sizeMethod(name: string): string {
  return `size of ${name}`;
}

/** Works one call and tells the recorder. Nothing but the engine's own interruption leaves by an exception. */
function work(
  engine: EngineModule,
  plugin: PluginInstance,
  entry: CellFunction,
  node: SyntaxNode,
  state: InterpreterState,
  declared: () => Shape,
): unknown {
  const recorder = recorderOf(plugin.config.context);
  try {
    const values: (CellValue | undefined)[] = [];
    let error: CellError | undefined;
    // Every argument is evaluated, so that no call inside a later one keeps the evidence of an earlier time.
    for (const argument of node.args) {
      const value = readArgument(engine, plugin.evaluateAst(argument, state));
      if (value instanceof engine.CellError) error ??= value;
      else values.push(argument.type === 'EMPTY' ? undefined : value);
    }
    if (error !== undefined) {
      recorder?.passedOn(state.formulaAddress, node);
      return error;
    }
    const answer = callFunction(entry, values);
    const result = engineValue(engine, answer.value, declared);
    recorder?.answered(state.formulaAddress, node, entry.name, answer);
    return result;
  } catch (thrown) {
    const error = namedError(entry.name, thrown);
    recorder?.failed(state.formulaAddress, node, error);
    return new engine.CellError(engine.ErrorType.VALUE, error.message);
  }
}

function namedError(functionName: string, thrown: unknown): InputError {
  const error = isInputError(thrown)
    ? thrown
    : inputError('function-failed', { reason: thrown instanceof Error ? thrown.message : String(thrown) });
  return new InputError(error.code, `${functionName}: ${error.message}`);
}
