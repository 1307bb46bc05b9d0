/**
 * Reads the text of `isonym.json`: JSON with comments and trailing commas, held against the settings' schema.
 * Every mistake is placed on its characters, and what is sound beside it still counts.
 */
import { Ajv, type ErrorObject } from 'ajv';
// By its ES module: the package's main file is UMD, whose inner `require` no bundler can follow.
import {
  findNodeAtLocation,
  getNodeValue,
  parseTree,
  printParseErrorCode,
  type Node,
  type ParseError,
} from 'jsonc-parser/lib/esm/main.js';
import type { Problem, TextRange } from '../chemistry/text.ts';
import type { Settings } from '../checks/settings.ts';

export interface ReadSettings {
  readonly settings: Settings;
  readonly problems: readonly Problem[];
}

export function readSettingsText(text: string, schema: object, defaults: Settings): ReadSettings {
  const syntaxErrors: ParseError[] = [];
  let tree: Node | undefined;
  try {
    tree = parseTree(text, syntaxErrors, { allowTrailingComma: true });
  } catch {
    // The parser descends with the nesting and runs out of stack in a file made for that.
    const message = 'isonym.json cannot be read: its brackets are nested too deeply.';
    return {
      settings: defaults,
      problems: [{ range: { start: 0, end: Math.min(1, text.length) }, message }],
    };
  }
  const problems: Problem[] = syntaxErrors.map((error) => ({
    range: { start: error.offset, end: Math.min(text.length, error.offset + Math.max(1, error.length)) },
    message: `isonym.json cannot be read here: ${inWords(printParseErrorCode(error.error))}.`,
  }));
  if (tree === undefined) return { settings: defaults, problems };

  const stated: unknown = getNodeValue(tree);
  const validate = new Ajv({ allErrors: true, strict: false, verbose: true }).compile(schema);
  if (!validate(stated)) {
    for (const error of validate.errors ?? []) {
      const path = pointerParts(error.instancePath);
      problems.push({ range: errorRange(tree, path, error), message: schemaMessage(path, error) });
      removeAt(stated, path, error);
    }
  }
  return { settings: merged(defaults, stated), problems: sorted(problems) };
}

/** `InvalidSymbol` to `invalid symbol`. */
function inWords(code: string): string {
  return code.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
}

function pointerParts(pointer: string): string[] {
  return pointer
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'));
}

function nodeAt(tree: Node, path: readonly string[]): Node | undefined {
  let node: Node | undefined = tree;
  for (const part of path) {
    node = node && findNodeAtLocation(node, [node.type === 'array' ? Number(part) : part]);
  }
  return node;
}

function errorRange(tree: Node, path: readonly string[], error: ErrorObject): TextRange {
  const node = nodeAt(tree, path) ?? tree;
  const extra = (error.params as { additionalProperty?: string }).additionalProperty;
  const property = extra === undefined ? undefined : nodeAt(node, [extra])?.parent?.children?.[0];
  const at = property ?? node;
  // A whole object in red says nothing: its opening brace stands for it.
  const length = at.type === 'object' || at.type === 'array' ? 1 : at.length;
  return { start: at.offset, end: at.offset + length };
}

function schemaMessage(path: readonly string[], error: ErrorObject): string {
  const params = error.params as { additionalProperty?: string; allowedValues?: readonly unknown[] };
  const where = path.length === 0 ? 'isonym.json' : `“${path.join(' → ')}”`;
  if (params.additionalProperty !== undefined) {
    const known = Object.keys((error.parentSchema?.['properties'] as object | undefined) ?? {});
    const list = known.length === 0 || known.length > 12 ? '' : ` It may hold: ${known.join(', ')}.`;
    return `${where} has no setting “${params.additionalProperty}”.${list}`;
  }
  if (params.allowedValues !== undefined) {
    return `${where} must be one of ${params.allowedValues.map((value) => JSON.stringify(value)).join(', ')}.`;
  }
  return `${where} ${error.message ?? 'is not as the schema wants it'}.`;
}

/** Takes out what is wrong, so that the default stands in its place. */
function removeAt(value: unknown, path: readonly string[], error: ErrorObject): void {
  const extra = (error.params as { additionalProperty?: string }).additionalProperty;
  const full = extra === undefined ? path : [...path, extra];
  const last = full.at(-1);
  let holder: unknown = value;
  for (const part of full.slice(0, -1)) holder = member(holder, part);
  if (last !== undefined && isObject(holder)) Reflect.deleteProperty(holder, last);
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

function member(value: unknown, name: string): unknown {
  return isObject(value) && Object.hasOwn(value, name) ? value[name] : undefined;
}

/** Stated values over the defaults, object by object. */
function merged<T>(defaults: T, stated: unknown): T {
  if (stated === undefined) return defaults;
  if (!isObject(defaults)) return typeof stated === typeof defaults ? (stated as T) : defaults;
  if (!isObject(stated)) return defaults;
  const result: Record<string, unknown> = { ...defaults };
  for (const [name, value] of Object.entries(stated)) {
    // `__proto__` is an own property here, and stays one.
    Object.defineProperty(result, name, {
      value: Object.hasOwn(defaults, name) ? merged(defaults[name], value) : value,
      enumerable: true,
      writable: true,
      configurable: true,
    });
  }
  return result as T;
}

function sorted(problems: readonly Problem[]): Problem[] {
  const seen = new Set<string>();
  return [...problems]
    .sort((a, b) => a.range.start - b.range.start)
    .filter((problem) => {
      const key = `${problem.range.start} ${problem.message}`;
      return !seen.has(key) && seen.add(key);
    });
}
