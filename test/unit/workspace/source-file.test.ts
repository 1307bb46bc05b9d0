import { describe, expect, it } from 'vitest';
import { decodeSource, readSourceFile } from '../../../server/workspace/source-file.ts';

const bytes = (...values: number[]) => Uint8Array.from(values);

describe('reading a file', () => {
  it('drops the byte order mark', () => {
    expect(decodeSource(Buffer.from('\ufeffname: µ'))).toEqual({ text: 'name: µ' });
  });

  it('says which byte is not UTF-8, and in which line', () => {
    // Latin-1 "°" in the second line.
    const latin1 = Buffer.from('mp: ok\nbp: 95 \xb0C', 'latin1');
    expect(decodeSource(latin1).problem).toContain('byte 15, in line 2');
    // A character cut off at the end of the file.
    expect(decodeSource(bytes(0x61, 0xe2, 0x82)).problem).toContain('byte 2, in line 1');
    expect(decodeSource(bytes(0xff, 0xfe, 0x61, 0)).problem).toContain('UTF-16');
  });

  it('says in words why a file cannot be read', () => {
    expect(readSourceFile('/no/such/file.md').problem).toBe('does not exist');
    expect(readSourceFile('/').problem).toBe('is a folder');
  });
});
