/** Published identifiers of well-known compounds raise no finding against their structures. */
import { describe, expect, it } from 'vitest';
import { casCheckDigit } from '../../server/checks/shared/cas.ts';
import { findingsWithToolkit } from '../support/analyse-text.ts';

describe('CAS Registry Numbers', () => {
  it('the worked example of the CAS check-digit page: 107-07-3, (7×1 + 0×2 + 7×3 + 0×4 + 1×5) mod 10', () => {
    expect(casCheckDigit('107-07-3')).toBe(3);
  });

  // From memory: numbers as on every bottle.
  it.each([
    ['water', '7732-18-5'],
    ['ethanol', '64-17-5'],
    ['benzene', '71-43-2'],
    ['caffeine', '58-08-2'],
    ['formaldehyde', '50-00-0'],
    ['tetrahydrofuran', '109-99-9'],
    ['palladium on carbon', '7440-05-3'],
    ['morphine', '57-27-2'],
  ])('%s %s', (_name, number) => {
    expect(`${number.slice(0, -1)}${casCheckDigit(number)}`).toBe(number);
  });

  it('other texts have none', () => {
    for (const text of ['', '1-00-0', '12345678-00-0', '58-8-2', '58–08–2', 'CAS 58-08-2']) {
      expect(casCheckDigit(text)).toBeUndefined();
    }
  });
});

describe('InChI and InChIKey', () => {
  // From memory, as printed in reference works; structures drawn from the names.
  it.each([
    ['ethanol', 'CCO', 'LFQSCWFLJHTTHZ-UHFFFAOYSA-N', 'InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3'],
    ['benzene', 'c1ccccc1', 'UHOVQNZJYSORNB-UHFFFAOYSA-N', 'InChI=1S/C6H6/c1-2-4-6-5-3-1/h1-6H'],
    [
      'aspirin',
      'CC(=O)Oc1ccccc1C(=O)O',
      'BSYNRYMUTXBXSQ-UHFFFAOYSA-N',
      'InChI=1S/C9H8O4/c1-6(10)13-8-5-3-2-4-7(8)9(11)12/h2-5H,1H3,(H,11,12)',
    ],
    [
      'L-alanine',
      'C[C@H](N)C(=O)O',
      'QNAYBMKLOCPYGJ-REOHCLBHSA-N',
      'InChI=1S/C3H7NO2/c1-2(4)3(5)6/h2H,4H2,1H3,(H,5,6)/t2-/m0/s1',
    ],
    [
      'morphine',
      'CN1CC[C@]23[C@@H]4[C@H]1CC5=C2C(=C(C=C5)O)O[C@H]3[C@H](C=C4)O',
      'BQJCRHHNABKAKU-KBQPJGBKSA-N',
      'InChI=1S/C17H19NO3/c1-18-7-6-17-10-3-5-13(20)16(17)21-15-12(19)4-2-9(14(15)17)8-11(10)18/h2-5,10-11,13,16,19-20H,6-8H2,1H3/t10-,11+,13-,16-,17-/m0/s1',
    ],
    [
      'fumaric acid',
      'OC(=O)/C=C/C(O)=O',
      'VZCYOOQTPOCHFL-OWOJBTEDSA-N',
      'InChI=1S/C4H4O4/c5-3(6)1-2-4(7)8/h1-2H,(H,5,6)(H,7,8)/b2-1+',
    ],
    [
      'maleic acid',
      'OC(=O)/C=C\\C(O)=O',
      'VZCYOOQTPOCHFL-UPHRSURJSA-N',
      'InChI=1S/C4H4O4/c5-3(6)1-2-4(7)8/h1-2H,(H,5,6)(H,7,8)/b2-1-',
    ],
  ])('%s', async (_name, smiles, inchiKey, inchi) => {
    const page = `\`\`\`compound\nSMILES: ${smiles}\nInChI: ${inchi}\nInChIKey: ${inchiKey}\n\`\`\``;
    expect(await findingsWithToolkit(page)).toEqual([]);
  });
});
