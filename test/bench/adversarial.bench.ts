/** How long names take that are made to be hard, at the greatest length that is read: the slowest of each family. */
import { createNameReader } from '../../server/chemistry/nomenclature/read-name.ts';
import { adversarialNames } from '../support/adversarial-names.ts';
import { show, timed } from './figures.ts';

const reader = createNameReader();
reader.readName('4-chlorophenyl acetate');
for (const [family, name] of adversarialNames) {
  // As long as it goes within the bound on length.
  let size = 1;
  while (size < 400 && name(size + 1).length <= 1500) size++;
  const text = name(size);
  const figures = timed(5, () => reader.readName(text), 1);
  show(`${family} (${String(text.length)} characters)`, figures, 'ms');
}
