import { create, parseDependencies, type MathNode } from 'mathjs/number';
import { InputError } from '../../contracts/input-error.js';
import { clip } from '../../quantities/clip.js';

/** A formula as a tree of nothing but arithmetic. */
export type Term =
  | { readonly kind: 'number'; readonly value: number }
  | { readonly kind: 'reading'; readonly name: string }
  | { readonly kind: 'minus'; readonly of: Term }
  | { readonly kind: 'operation'; readonly by: Operation; readonly left: Term; readonly right: Term };
export type Operation = 'add' | 'subtract' | 'multiply' | 'divide';

/** The longest formula that is read. It bounds everything after it: nodes, depth, time. */
export const longestFormula = 200;
const deepest = 24;

/** Only the parser: nothing here can evaluate, and no function or constant has a meaning. */
const { parse } = create({ ...parseDependencies }, {});

const allowed = /^[A-Za-z0-9_ .+\-*/()]*$/;
const operations: ReadonlyMap<string, Operation> = new Map(
  (['add', 'subtract', 'multiply', 'divide'] as const).map((by) => [by, by]),
);

/**
 * Reads a formula (at most 200 characters) of named readings, plain numbers, + − × ÷, brackets and a minus
 * before a term; `*`, `/`, `-` and `·` are read too. Whatever else a parser may know is refused, node by node,
 * before anything is worked out. Throws `InputError` on `field`.
 */
export function parseFormula(input: unknown, field = 'formula'): Term {
  const refuse = (message: string): never => {
    throw new InputError(field, message);
  };
  if (typeof input !== 'string' || input.trim() === '') {
    return refuse('Write a formula such as bore_min − journal_max.');
  }
  if (input.length > longestFormula) {
    return refuse(`A formula has at most ${longestFormula} characters.`);
  }
  const text = input.replace(/[×·⋅]/g, '*').replace(/÷/g, '/').replace(/[−–]/g, '-').replace(/\s/g, ' ');
  if (!allowed.test(text)) {
    return refuse('Only names of readings, numbers with a point, + − × ÷ and brackets may stand here.');
  }
  if (/(?<![\w.])0[box]/i.test(text)) return refuse('Only plain decimal numbers may stand here.');
  return termOf(parsed(text, refuse), 0, refuse);
}

type Refuse = (message: string) => never;

function parsed(text: string, refuse: Refuse): MathNode {
  try {
    return parse(text);
  } catch {
    return refuse('This is no complete formula: look for a bracket or a sign that is missing.');
  }
}

function termOf(node: unknown, depth: number, refuse: Refuse): Term {
  if (depth > deepest) return refuse(`Brackets and signs go at most ${deepest} deep here.`);
  const { type, ...parts } = node as Readonly<Record<string, unknown>>;
  const next = (inner: unknown): Term => termOf(inner, depth + 1, refuse);
  switch (type) {
    case 'ParenthesisNode':
      return next(parts['content']);
    case 'ConstantNode':
      return numberOf(parts['value'], refuse);
    case 'SymbolNode':
      return { kind: 'reading', name: String(parts['name']) };
    case 'OperatorNode':
      return operationOf(parts, next, refuse);
    default:
      return refuse('Only arithmetic may stand here: names of readings, numbers, + − × ÷ and brackets.');
  }
}

function numberOf(value: unknown, refuse: Refuse): Term {
  return typeof value === 'number' && Number.isFinite(value)
    ? { kind: 'number', value }
    : refuse('Only plain numbers may stand here.');
}

function operationOf(
  parts: Readonly<Record<string, unknown>>,
  next: (inner: unknown) => Term,
  refuse: Refuse,
): Term {
  const [fn, args] = [String(parts['fn']), parts['args']];
  const [left, right] = Array.isArray(args) ? (args as readonly unknown[]) : [];
  if (fn === 'unaryMinus') return { kind: 'minus', of: next(left) };
  if (fn === 'unaryPlus') return next(left);
  const by = operations.get(fn);
  if (by === undefined) return refuse(`“${clip(fn)}” is not known here: only + − × ÷ and brackets.`);
  if (parts['implicit'] === true) return refuse('Write the sign between the two: × for times.');
  return { kind: 'operation', by, left: next(left), right: next(right) };
}

/** The readings that a formula names, each once, in the order in which they stand. */
export function namesIn(term: Term): readonly string[] {
  switch (term.kind) {
    case 'number':
      return [];
    case 'reading':
      return [term.name];
    case 'minus':
      return namesIn(term.of);
    case 'operation':
      return [...new Set([...namesIn(term.left), ...namesIn(term.right)])];
  }
}
