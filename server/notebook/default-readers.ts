/** The value readers that remember nothing; the workspace wraps them in a memory. */
import { readName } from '../chemistry/nomenclature/read-name.ts';
import { readSmiles } from '../chemistry/structure/read-smiles.ts';
import type { ValueReaders } from './model.ts';

export const defaultReaders: ValueReaders = { readSmiles, readName };
