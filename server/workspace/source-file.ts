/** Reads notebook files as UTF-8, strictly: a file in another encoding is said to be so, never half understood. */
import { readFileSync } from 'node:fs';

export type SourceFile =
  | { readonly text: string; readonly problem?: undefined }
  | { readonly text?: undefined; readonly problem: string };

/** A notebook page of this length is no notebook page. */
export const largestFileBytes = 20_000_000;

const utf8 = new TextDecoder('utf-8', { fatal: true });

/** The byte order mark, if there is one, is left out, as editors do. */
export function readSourceFile(path: string): SourceFile {
  let bytes: Buffer;
  try {
    bytes = readFileSync(path);
  } catch (error) {
    return { problem: reason(error) };
  }
  return decodeSource(bytes);
}

export function decodeSource(bytes: Uint8Array): SourceFile {
  if (bytes.length > largestFileBytes) {
    return { problem: `is larger than ${largestFileBytes / 1_000_000} MB, which no notebook page is` };
  }
  try {
    return { text: utf8.decode(bytes) };
  } catch {
    return { problem: `is not UTF-8 text (${firstFault(bytes)}); save it as UTF-8 and check it again` };
  }
}

/** What the operating system says, in words; other messages as they are. */
export function reason(error: unknown): string {
  const code = (error as { code?: unknown } | undefined)?.code;
  if (code === 'ENOENT') return 'does not exist';
  if (code === 'EACCES' || code === 'EPERM') return 'may not be read: permission denied';
  if (code === 'EISDIR') return 'is a folder';
  if (code === 'ENOTDIR') return 'does not exist: a part of its path is no folder';
  if (code === 'EMFILE' || code === 'ENFILE') return 'cannot be opened: too many files are open';
  if (code === 'ENOSPC') return 'cannot be written: the disk is full';
  if (code === 'EROFS') return 'cannot be written: the disk is read-only';
  return error instanceof Error ? error.message : String(error);
}

function firstFault(bytes: Uint8Array): string {
  if ((bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff)) {
    return 'it begins like UTF-16';
  }
  // Where replacing the faults and encoding again changes the first byte.
  const repaired = Buffer.from(new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes));
  let at = 0;
  while (at < bytes.length && bytes[at] === repaired[at]) at++;
  let line = 1;
  for (let i = 0; i < at; i++) if (bytes[i] === 0x0a) line++;
  return `byte ${at + 1}, in line ${line}, is no part of it`;
}
