/** Names that the editor sees. */
import { CodeActionKind } from 'vscode-languageserver';

/** The source of our diagnostics. */
export const findingSource = 'isonym';

/** Applies every fix that is certain. */
export const fixAllKind = `${CodeActionKind.SourceFixAll}.isonym`;
