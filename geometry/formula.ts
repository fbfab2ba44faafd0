/**
 * A law as a formula in the swept fraction x. Parsed by mathjs, whose tree is then let through only
 * where it is numbers, x, π, e, arithmetic and the functions listed here: no assignment, no
 * definition, no access to anything else. Without loops the time is bounded by the size.
 */

import {
  addDependencies,
  create,
  divideDependencies,
  multiplyDependencies,
  parseDependencies,
  powDependencies,
  subtractDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
  type FactoryFunctionMap,
  type MathNode,
} from 'mathjs/number';

const { parse } = create({
  addDependencies,
  divideDependencies,
  multiplyDependencies,
  parseDependencies,
  powDependencies,
  subtractDependencies,
  unaryMinusDependencies,
  unaryPlusDependencies,
} as FactoryFunctionMap);

export const LONGEST_FORMULA = 200;
const MOST_NODES = 100;

const constants: Record<string, number> = { pi: Math.PI, e: Math.E };

const functions: Record<string, (...values: number[]) => number> = {
  sqrt: Math.sqrt,
  cbrt: Math.cbrt,
  exp: Math.exp,
  log: Math.log,
  log10: Math.log10,
  log2: Math.log2,
  sin: Math.sin,
  cos: Math.cos,
  tan: Math.tan,
  asin: Math.asin,
  acos: Math.acos,
  atan: Math.atan,
  sinh: Math.sinh,
  cosh: Math.cosh,
  tanh: Math.tanh,
  abs: Math.abs,
  min: Math.min,
  max: Math.max,
};

export const formulaFunctions: readonly string[] = Object.keys(functions);

const operators = new Set(['+', '-', '*', '/', '^']);

/** Why a tree is not let through, or null. */
function refusalOf(root: MathNode): string | null {
  let nodes = 0;
  let refusal: string | null = null;
  root.traverse((node) => {
    nodes += 1;
    if (refusal !== null) return;
    const { type, name, op, value, fn } = node as MathNode & {
      name?: string;
      op?: string;
      value?: unknown;
      fn?: { type: string; name?: string };
    };
    if (type === 'ConstantNode') {
      if (typeof value !== 'number' || !Number.isFinite(value)) {
        refusal = `${String(value)} is not a number`;
      }
    } else if (type === 'SymbolNode') {
      const known =
        name === 'x' || Object.hasOwn(constants, name!) || Object.hasOwn(functions, name!);
      if (!known) refusal = `${name!} is not known; use x, pi and e`;
    } else if (type === 'OperatorNode') {
      if (!operators.has(op!)) refusal = `${op!} can't be used; + - * / ^ can`;
    } else if (type === 'FunctionNode') {
      if (fn?.type !== 'SymbolNode' || !Object.hasOwn(functions, fn.name ?? '')) {
        refusal = `${fn?.name ?? 'that'} is not a function here; use ${formulaFunctions.join(', ')}`;
      }
    } else if (type !== 'ParenthesisNode') {
      refusal = 'only numbers, x, arithmetic and functions can be used';
    }
  });
  if (refusal !== null) return refusal;
  return nodes > MOST_NODES ? `it has ${nodes} parts; at most ${MOST_NODES} can be` : null;
}

export type ReadFormula =
  | { readonly ok: true; readonly valueAt: (x: number) => number }
  | { readonly ok: false; readonly message: string };

/** Reads a formula; what it gives may still be no number at some x. */
export function readFormula(text: string): ReadFormula {
  if (text.trim() === '')
    return { ok: false, message: 'it is empty; write one in x, like x^1.5' };
  if (text.length > LONGEST_FORMULA) {
    return {
      ok: false,
      message: `it is ${text.length} characters long; at most ${LONGEST_FORMULA} can be`,
    };
  }
  let tree: MathNode;
  try {
    tree = parse(text);
  } catch (error) {
    return { ok: false, message: error instanceof Error ? error.message : 'it cannot be read' };
  }
  const refusal = refusalOf(tree);
  if (refusal !== null) return { ok: false, message: refusal };
  const compiled = tree.compile();
  const scope = new Map<string, unknown>([
    ...Object.entries(constants),
    ...Object.entries(functions),
  ]);
  return {
    ok: true,
    valueAt: (x) => {
      scope.set('x', x);
      const value: unknown = compiled.evaluate(scope);
      return typeof value === 'number' ? value : NaN;
    },
  };
}
