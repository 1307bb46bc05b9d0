/** Every parent of the vocabulary, read by its own name, is the structure that stands beside it. */
import { expect, test } from 'vitest';
import { naturalParents } from '../../../../server/chemistry/nomenclature/vocabulary/natural-parents.ts';
import { parents } from '../../../../server/chemistry/nomenclature/vocabulary/parents.ts';
import { ringsWithGroups } from '../../../../server/chemistry/nomenclature/vocabulary/partly-saturated-rings.ts';
import { readName } from '../../../../server/chemistry/nomenclature/read-name.ts';
import { constitutionalSmiles } from '../../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../../server/chemistry/structure/read-smiles.ts';

test('a parent is read as its own structure', () => {
  const wrong: string[] = [];
  let held = 0;
  for (const [name, smiles, , mark] of [...parents, ...naturalParents, ...ringsWithGroups]) {
    // The reagent is the tautomer with P–H; its esters are those of P(OH)3.
    if (mark !== undefined || name === 'phosphorous acid') continue;
    const wanted = constitutionalSmiles(readSmiles(smiles).value!);
    for (const written of [name, `${name}e`]) {
      const reading = readName(written);
      if (reading.kind !== 'understood') continue;
      held++;
      const found = reading.readings.map(({ molecule }) => constitutionalSmiles(molecule));
      if (!found.includes(wanted)) wrong.push(`${written}: ${found.join(' ')} for ${wanted}`);
    }
  }
  expect(wrong).toEqual([]);
  expect(held).toBeGreaterThan(150);
});
