/**
 * The editor's own TextMate engine and its own Markdown grammar, with our grammar injected as package.json says.
 * Both are taken from the editor that runs the test; the editor offers no way to ask for the tokens on the screen.
 */
import { existsSync, readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { env, extensions } from 'vscode';
import { ourExtension } from './support.ts';

/** A piece of a line with its scopes, outermost first. */
export interface Token {
  readonly text: string;
  readonly scopes: readonly string[];
}

interface Grammar {
  tokenizeLine(
    line: string,
    state: unknown,
  ): {
    readonly tokens: readonly { startIndex: number; endIndex: number; scopes: string[] }[];
    readonly ruleStack: unknown;
  };
}

interface TextMate {
  readonly INITIAL: unknown;
  readonly parseRawGrammar: (text: string, path: string) => unknown;
  readonly Registry: new (options: object) => { loadGrammar(scope: string): Promise<Grammar | null> };
}

interface Oniguruma {
  loadWASM(data: ArrayBufferLike | Uint8Array): Promise<void>;
  readonly OnigScanner: new (patterns: string[]) => unknown;
  readonly OnigString: new (text: string) => unknown;
}

interface GrammarContribution {
  readonly scopeName: string;
  readonly path: string;
  readonly injectTo?: readonly string[];
}

function modulesFolder(): string {
  const folder = ['node_modules.asar', 'node_modules']
    .map((name) => join(env.appRoot, name))
    .find((path) => existsSync(join(path, 'vscode-textmate')));
  if (folder === undefined) throw new Error(`no vscode-textmate in ${env.appRoot}`);
  return folder;
}

let loaded: Promise<Grammar> | undefined;

async function load(): Promise<Grammar> {
  const modules = modulesFolder();
  const require = createRequire(join(modules, 'here.js'));
  const textMate = require('vscode-textmate') as TextMate;
  const oniguruma = require('vscode-oniguruma') as Oniguruma;
  await oniguruma.loadWASM(readFileSync(join(modules, 'vscode-oniguruma', 'release', 'onig.wasm')));
  INITIAL = textMate.INITIAL;

  const files = new Map<string, string>();
  const injections = new Map<string, string[]>();
  for (const extension of [ourExtension(), ...extensions.all.filter((one) => one.id.startsWith('vscode.'))]) {
    const contributes = (extension.packageJSON as { contributes?: { grammars?: GrammarContribution[] } })
      .contributes;
    for (const { scopeName, path, injectTo } of contributes?.grammars ?? []) {
      files.set(scopeName, join(extension.extensionPath, path));
      for (const target of injectTo ?? []) {
        injections.set(target, [...(injections.get(target) ?? []), scopeName]);
      }
    }
  }
  const registry = new textMate.Registry({
    onigLib: Promise.resolve({
      createOnigScanner: (patterns: string[]) => new oniguruma.OnigScanner(patterns),
      createOnigString: (text: string) => new oniguruma.OnigString(text),
    }),
    loadGrammar: (scope: string) => {
      const file = files.get(scope);
      return Promise.resolve(
        file === undefined ? null : textMate.parseRawGrammar(readFileSync(file, 'utf8'), file),
      );
    },
    getInjections: (scope: string) => injections.get(scope) ?? [],
  });
  const grammar = await registry.loadGrammar('text.html.markdown');
  if (grammar === null) throw new Error('the editor has no Markdown grammar');
  return grammar;
}

let INITIAL: unknown;

/** The tokens of each line. */
export async function tokenize(lines: readonly string[]): Promise<Token[][]> {
  loaded ??= load();
  const grammar = await loaded;
  let state = INITIAL;
  return lines.map((line) => {
    const { tokens, ruleStack } = grammar.tokenizeLine(line, state);
    state = ruleStack;
    return tokens.map(({ startIndex, endIndex, scopes }) => ({
      text: line.slice(startIndex, endIndex),
      scopes,
    }));
  });
}
