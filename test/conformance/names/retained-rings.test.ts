/**
 * Rings with names and numberings of their own. Rule numbers are those of the IUPAC Recommendations 2013; structures are
 * drawn by hand from the tables there (from memory), usage of index names is common practice, no source.
 */
import { describe, expect, test } from 'vitest';
import { readName } from '../../../server/chemistry/nomenclature/read-name.ts';
import { canonicalSmiles } from '../../../server/chemistry/structure/canonical-smiles.ts';
import { readSmiles } from '../../../server/chemistry/structure/read-smiles.ts';

function readings(name: string): string[] {
  const reading = readName(name);
  if (reading.kind !== 'understood') throw new Error(`${name}: ${reading.message}`);
  return reading.readings.map(({ molecule }) => canonicalSmiles(molecule)).sort();
}
const canonical = (smiles: string) => canonicalSmiles(readSmiles(smiles).value!);

type Row = readonly [rule: string, name: string, ...smiles: string[]];

function meansExactly(rows: readonly Row[]): void {
  test.each(rows.map(([rule, name, ...smiles]) => ({ rule, name, smiles })))(
    '$rule: $name',
    ({ name, smiles }) => {
      expect(readings(name)).toEqual(smiles.map(canonical).sort());
    },
  );
}

describe('carbocycles', () => {
  meansExactly([
    ['P-25.1.1', 'pentalene', 'C1=CC2=CC=CC2=C1'],
    ['P-25.1.1', 'heptalene', 'C1=CC=C2C=CC=CC=C2C=C1'],
    ['P-25.1.1', 'azulene', 'c1ccc2cccc-2cc1'],
    ['P-25.1.1', 'biphenylene', 'c1ccc2c(c1)-c1ccccc1-2'],
    ['P-25.1.1', 'as-indacene', 'C1=CC2=CC=C3C=CC=C3C2=C1'],
    ['P-25.1.1', 's-indacene', 'C1=CC2=CC3=CC=CC3=CC2=C1'],
    ['P-25.1.1', '1H-phenalene', 'C1C=Cc2cccc3cccc1c23'],
    ['P-25.1.1', 'fluoranthene', 'c1ccc2c(c1)-c1cccc3cccc-2c13'],
    ['P-25.1.1', 'aceanthrylene', 'C1=Cc2cccc3cc4ccccc4c1c23'],
    ['P-25.1.1', 'acephenanthrylene', 'C1=Cc2cccc3c2c1cc1ccccc13'],
    ['P-25.1.1', 'triphenylene', 'c1ccc2c(c1)c1ccccc1c1ccccc21'],
    ['P-25.1.1', 'chrysene', 'c1ccc2c(c1)ccc1c2ccc2ccccc12'],
    ['P-25.1.1', 'picene', 'c1ccc2c(c1)ccc1c2ccc2c1ccc1ccccc12'],
    ['P-25.1.1', 'perylene', 'c1cc2cccc3c4cccc5cccc(c(c1)c23)c45'],
    ['P-25.1.1', 'coronene', 'c1cc2ccc3ccc4ccc5ccc6ccc1c1c2c3c4c5c61'],
    ['P-25.1.2.1', 'tetracene', 'c1ccc2cc3cc4ccccc4cc3cc2c1'],
    ['P-25.1.2.1', 'naphthacene', 'c1ccc2cc3cc4ccccc4cc3cc2c1'],
    ['P-25.1.2.1', 'pentacene', 'c1ccc2cc3cc4cc5ccccc5cc4cc3cc2c1'],
    ['P-25.1.2.1', 'hexacene', 'c1ccc2cc3cc4cc5cc6ccccc6cc5cc4cc3cc2c1'],
    ['P-25.1.2.2', 'tetraphene', 'c1ccc2cc3c(ccc4ccccc43)cc2c1'],
    ['P-25.1.2.2', 'pentaphene', 'c1ccc2cc3c(ccc4cc5ccccc5cc43)cc2c1'],
    ['P-25.3.1.3', '6-methylchrysene', 'Cc1cc2c3ccccc3ccc2c2ccccc12'],
    ['P-25.3.1.3', '3-methylfluoranthene', 'Cc1ccc2c3c1cccc3-c1ccccc12'],
    ['P-25.3.1.3', 'pentacene-6,13-dione', 'O=C1c2cc3ccccc3cc2C(=O)c2cc3ccccc3cc12'],
    ['P-25.3.1.3', 'tetracene-5,12-dione', 'O=C1c2ccccc2C(=O)c2cc3ccccc3cc12'],
    ['from memory', 'tetraphenylmethane', 'c1ccc(cc1)C(c1ccccc1)(c1ccccc1)c1ccccc1'],
    ['from memory', 'benzo[ghi]perylene', 'c1cc2ccc3ccc4ccc5cccc6c(c1)c2c3c4c56'],
    ['from memory', 'benzo[k]fluoranthene', 'c1ccc2cc3c(cc2c1)-c1cccc2cccc-3c12'],
    [
      'from memory',
      'perylene-3,4,9,10-tetracarboxylic acid',
      'OC(=O)c1ccc2c3ccc(C(=O)O)c4c(C(=O)O)ccc(c5ccc(C(=O)O)c1c25)c34',
    ],
    ['common practice, no source', 'norbornene', 'C1CC2CC1C=C2'],
    ['common practice, no source', '5-norbornene-2-carbaldehyde', 'O=CC1CC2CC1C=C2'],
    ['common practice, no source', 'norbornadiene', 'C1C2C=CC1C=C2'],
    ['P-23.7', 'prismane', 'C12C3C4C1C4C23'],
    ['common practice, no source', 'quadricyclane', 'C1C2C3C2C2C1C32'],
    ['common practice, no source', 'homoadamantane', 'C1CC2CC3CC1CC(C2)C3'],
  ]);
});

describe('heterocycles', () => {
  meansExactly([
    ['P-25.2.1', '1H-pyrrolizine', 'C1C=CN2C=CC=C12'],
    ['P-25.2.1', 'hexahydro-1H-pyrrolizine', 'C1CC2CCCN2C1'],
    ['P-25.2.1', '4H-quinolizin-4-one', 'O=c1cccc2ccccn12'],
    ['P-25.2.1', '2,6-naphthyridine', 'c1cc2cnccc2cn1'],
    ['P-25.2.1', '2,7-naphthyridine', 'c1cc2ccncc2cn1'],
    ['P-25.2.1', 'phenanthridine', 'c1ccc2c(c1)cnc1ccccc12'],
    ['P-25.2.1', '6-chlorophenanthridine', 'Clc1nc2ccccc2c2ccccc12'],
    ['P-25.2.1', '1,10-phenanthroline', 'c1cnc2c(c1)ccc1cccnc12'],
    ['P-25.2.1', '1,7-phenanthroline', 'c1cnc2c(c1)ccc1ncccc12'],
    ['P-25.2.1', '4,7-phenanthroline', 'c1cnc2ccc3ncccc3c2c1'],
    ['P-25.2.1', '2,9-dimethyl-1,10-phenanthroline', 'Cc1ccc2ccc3ccc(C)nc3c2n1'],
    ['P-25.2.1', '1H-perimidine', 'c1cc2cccc3c2c(c1)[nH]cn3'],
    ['P-25.2.2.2', 'thianthrene', 'c1ccc2c(c1)Sc1ccccc1S2'],
    ['P-25.2.2.2', 'phenoxathiine', 'c1ccc2c(c1)Oc1ccccc1S2'],
    ['P-25.2.2.2', 'oxanthrene', 'c1ccc2c(c1)Oc1ccccc1O2'],
    ['P-25.2.1', '2H-thiochromene', 'C1Sc2ccccc2C=C1'],
    ['P-25.2.1', '1H-isothiochromene', 'C1SC=Cc2ccccc12'],
    ['P-31.1.4.2.4', 'isochromane', 'C1OCCc2ccccc12'],
    ['P-31.1.4.2.4', 'thiochroman-4-one', 'O=C1CCSc2ccccc12'],
    ['P-31.1.4.2.4', 'isoindoline-1,3-dione', 'O=C1NC(=O)c2ccccc12'],
    ['from memory', '9H-α-carboline', 'c1ccc2c(c1)[nH]c1ncccc12'],
    ['from memory', '1-methyl-9H-β-carboline', 'Cc1nccc2c1[nH]c1ccccc12'],
    ['from memory', '1,2,3,4-tetrahydro-β-carboline', 'C1Cc2c(CN1)[nH]c1ccccc21'],
    ['from memory', '2,3,4,5-tetrahydro-1H-γ-carboline', 'C1Cc2[nH]c3ccccc3c2CN1'],
    ['common practice, no source', 'quinuclidin-3-ol', 'OC1CN2CCC1CC2'],
    ['common practice, no source', '3-quinuclidinone', 'O=C1CN2CCC1CC2'],
    ['P-22.2.1', 'furazan', 'c1cnon1'],
    ['common practice, no source', '2-methyl-2-oxazoline', 'CC1=NCCO1'],
    ['common practice, no source', '2-imidazoline', 'C1CN=CN1'],
    ['common practice, no source', 'thiazoline', 'C1CSC=N1', 'C1SCC=N1', 'C1NC=CS1'],
    ['common practice, no source', 'phthalide', 'O=C1OCc2ccccc12'],
    ['common practice, no source', 'tropolone', 'Oc1cccccc1=O'],
    ['common practice, no source', '1,4-benzodioxan-2-ylmethanol', 'OCC1COc2ccccc2O1'],
    ['common practice, no source', 's-triazine', 'c1ncncn1'],
    ['P-22.2.2.1', '1H-tetrazole', 'c1nnn[nH]1'],
    ['P-22.2.2.1', '5-phenyl-2H-tetrazole', 'c1ccccc1-c1nn[nH]n1'],
    ['P-22.2.2.1', '1H-arsole', '[AsH]1C=CC=C1'],
    ['P-22.2.2.1', '4H-1,3-thiazine', 'C1C=CSC=N1'],
    ['P-22.2.2.1', '2-methyloxaziridine', 'CN1CO1'],
  ]);
});

describe('heteromonocycles without locants', () => {
  // One reading for every arrangement of the heteroatoms: necklaces of five or six with so many of each kind.
  meansExactly([
    ['P-22.2.2.1.3', 'dithiolane', 'C1CCSS1', 'C1CSCS1'],
    ['P-22.2.2.1.3', 'trithiane', 'C1CSSSC1', 'C1CSSCS1', 'C1SCSCS1'],
    ['P-22.2.2.1.3', 'triazine', 'c1cnnnc1', 'c1cnncn1', 'c1ncncn1'],
    ['P-22.2.2.1.3', 'oxadiazole', 'c1conn1', 'c1nonc1', 'c1ncon1', 'c1nnco1'],
    ['P-22.2.2.1.3', 'triazole', 'c1c[nH]nn1', 'c1nc[nH]n1'],
    ['P-22.2.2.1.3', 'oxaziridine', 'C1NO1'],
    ['P-22.2.2.1.3', 'tetrazole', 'c1nnn[nH]1'],
    ['common practice, no source', 'dioxolane', 'C1COCO1'],
  ]);
  test.each(['ethylthiol', 'ethylselenol', 'dioxin'])('%s is no ring', (name) => {
    expect(readName(name).kind).toBe('unknown');
  });
});

describe('hydrogen of rings', () => {
  meansExactly([
    ['P-31.1.4.2.4', '1,2,3,4-tetrahydroquinoline', 'C1CNc2ccccc2C1'],
    ['P-31.1.4.3.4', 'quinolin-2(1H)-one', 'O=c1ccc2ccccc2[nH]1'],
    ['P-31.1.4.3.4', 'naphthalen-1(2H)-one', 'O=C1CC=Cc2ccccc12'],
    ['P-31.1.4.3.4', '3,4-dihydronaphthalen-1(2H)-one', 'O=C1CCCc2ccccc12'],
    ['P-31.1.4.3.4', 'octahydronaphthalen-4a(2H)-ol', 'OC12CCCCC1CCCC2'],
    ['P-31.1.4.2.1', '2,3-dihydro-1H-indene', 'C1Cc2ccccc2C1'],
    ['1979 rules C-315.1', '2(1H)-quinolinone', 'O=c1ccc2ccccc2[nH]1'],
    ['1979 rules C-315.1', '4(3H)-quinazolinone', 'O=c1[nH]cnc2ccccc12'],
    ['1979 rules C-315.1', '3,4-dihydro-1(2H)-naphthalenone', 'O=C1CCCc2ccccc12'],
    ['1979 rules C-315.1', '1,3(2H,4H)-isoquinolinedione', 'O=C1Cc2ccccc2C(=O)N1'],
    ['1979 rules C-315.1', '2,4(1H,3H)-pyrimidinedione', 'O=c1cc[nH]c(=O)[nH]1'],
    ['1979 rules C-315.1', '3(2H)-pyridazinone', 'O=c1cccn[nH]1'],
  ]);
});
