import { describe, expect, it } from 'vitest';
import { remembering } from '../../../server/workspace/remembering.ts';

describe('a reader that remembers', () => {
  it('reads the same text once, and hands out the same value', () => {
    let reads = 0;
    const read = remembering(
      (text) => ({ text, number: ++reads }),
      () => ({ text: '', number: -1 }),
    );
    const first = read('ethanol');
    expect(read('ethanol')).toBe(first);
    expect(read('methanol').number).toBe(2);
  });

  it('keeps no long text, and no more than it may', () => {
    let reads = 0;
    const read = remembering(
      () => ({ number: ++reads }),
      () => ({ number: -1 }),
    );
    read('x'.repeat(3000));
    read('x'.repeat(3000));
    expect(reads).toBe(2);
    for (let i = 0; i < 6000; i++) read(String(i));
    read('0');
    expect(reads).toBe(6003);
  });

  it('turns an exception into an answer, once', () => {
    let calls = 0;
    const read = remembering(
      (): { message: string } => {
        calls++;
        throw new RangeError('Maximum call stack size exceeded');
      },
      (_, message) => ({ message }),
    );
    expect(read('x').message).toContain('broke down on this text (Maximum call stack size exceeded)');
    read('x');
    expect(calls).toBe(1);
  });
});
