/**
 * The form of an InChI: prefix, formula layer, then layers that each begin with a letter (InChI Technical Manual,
 * version 1.07, InChI Trust, chapter II). Whether it is the InChI of the compound is a check.
 */
import { problemAt, type Read } from '../../chemistry/text.ts';
import { shortened } from './read-cas.ts';

const prefix = /^InChI=1S?\//;
const formulaLayer = /^(?:\d*(?:[A-Z][a-z]?\d*)+)(?:\.\d*(?:[A-Z][a-z]?\d*)+)*$/;
/** Letters that begin a layer, and what may stand in it. */
const layers: Readonly<Record<string, RegExp>> = {
  c: /^[\d,()*;\-m]*$/,
  h: /^[\dHDT,()*;\-m]*$/,
  q: /^[\d+\-*;m]*$/,
  p: /^[\d+-]*$/,
  b: /^[\d+\-?,;*um]*$/,
  t: /^[\d+\-?,;*um]*$/,
  m: /^[01.]*$/,
  s: /^[123]$/,
  i: /^[\d+\-DTH,;*()m]*$/,
  f: /^[A-Za-z\d.]*$/,
  o: /^[\d(),]*$/,
  r: /^[A-Za-z\d.]*$/,
};

export function readInchi(text: string): Read<string> {
  const start = prefix.exec(text)?.[0].length;
  if (start === undefined) {
    return problemAt(
      0,
      Math.min(text.length, 'InChI=1S/'.length),
      `An InChI begins with “InChI=1S/” (“InChI=1/” when it is not the standard one), but this begins with ` +
        `“${text.slice(0, 9)}”. Copy the whole of it.`,
    );
  }
  const space = text.search(/\s/);
  if (space !== -1) {
    return problemAt(space, space + 1, 'An InChI holds no space. Take it out, or copy the InChI again.');
  }
  let at = start;
  for (const [index, layer] of text.slice(start).split('/').entries()) {
    const isFormula = index === 0 && formulaLayer.test(layer);
    // A lone proton has no formula, only its charge: InChI=1S/p+1.
    const isLayer = !isFormula && layers[layer[0] ?? '']?.test(layer.slice(1)) === true;
    if (!isFormula && !isLayer) {
      return problemAt(
        layer === '' ? at - 1 : at,
        at + layer.length,
        layer === ''
          ? 'An empty layer: two slashes follow each other, or the InChI was cut off here. Copy the whole of it.'
          : `“${shortened(layer)}” is no ${index === 0 ? 'formula, which is the first layer' : 'layer'} of an ` +
              'InChI. It was cut or mistyped; copy the whole of it again.',
      );
    }
    at += layer.length + 1;
  }
  return { value: text };
}
