import { describe, expect, it } from 'vitest';
import type { RdkitModule } from '../../../server/toolkit/rdkit-module.ts';
import { countSmilesAtoms, RdkitService } from '../../../server/toolkit/service.ts';
import { mostAtoms } from '../../../server/toolkit/toolkit.ts';

/** RDKit as far as the service knows it, counting what is alive. */
function fakeRdkit(trouble: Record<string, unknown> = {}) {
  const counts = { made: 0, deleted: 0, loads: 0 };
  const load = (): Promise<RdkitModule> => {
    counts.loads++;
    return Promise.resolve({
      get_inchikey_for_inchi: (inchi) => `key ${inchi}`,
      get_mol: (smiles) => {
        if (smiles === 'unreadable') return null;
        counts.made++;
        return {
          get_smiles: () => smiles,
          get_inchi: () => {
            // RDKit lets C++ exceptions through, which are no Error objects.
            if (smiles in trouble) throw trouble[smiles];
            return smiles === '*' ? '' : `inchi ${smiles}`;
          },
          get_descriptors: () => '{"CrippenClogP":1.5E0,"CrippenMR":2E1}',
          get_svg_with_highlights: () => '<svg><text x="1">no path</text></svg>',
          delete: () => {
            counts.deleted++;
          },
        };
      },
    });
  };
  return { counts, service: new RdkitService(load) };
}

describe('asking RDKit', () => {
  it('deletes every molecule', async () => {
    const { counts, service } = fakeRdkit();
    await service.facts('CCO');
    await service.crippen('CCO');
    await service.draw('CCO', { widthPx: 10, heightPx: 10 });
    expect(await service.facts('unreadable')).toBeNull();
    expect(counts).toEqual({ made: 3, deleted: 3, loads: 1 });
  });

  it('keeps an empty InChI apart from an unreadable structure', async () => {
    const { service } = fakeRdkit();
    expect(await service.facts('*')).toEqual({ smiles: '*', inchi: '', inchiKey: '' });
  });

  it('starts afresh after a crash and answers the next question', async () => {
    const { counts, service } = fakeRdkit({
      deadly: new Error('memory access out of bounds'),
      thrown: 5263976,
    });
    expect(await service.facts('deadly')).toBeNull();
    expect(await service.facts('CCO')).not.toBeNull();
    expect(await service.facts('thrown')).toBeNull();
    expect(await service.facts('CCO')).not.toBeNull();
    expect(counts.loads).toBe(3);
  });

  it('stops reloading a build that always crashes', async () => {
    const { service } = fakeRdkit({ deadly: new Error('trap') });
    const askUntilRefused = async () => {
      for (let i = 0; i < 20; i++) await service.facts('deadly');
    };
    await expect(askUntilRefused()).rejects.toThrow('broke down too often');
  });

  it('hands out nothing for structures too large for its stack, without asking', async () => {
    const { counts, service } = fakeRdkit();
    expect(await service.facts('C'.repeat(mostAtoms + 1))).toBeNull();
    expect(await service.facts('')).toBeNull();
    expect(counts.made).toBe(0);
    expect(await service.facts('C'.repeat(mostAtoms))).not.toBeNull();
  });

  it('counts the atoms of a SMILES text', () => {
    expect(countSmilesAtoms('COc1ccc(Br)cc1')).toBe(9);
    expect(countSmilesAtoms('[Na+].[Cl-]')).toBe(2);
    expect(countSmilesAtoms('C[C@@H](N)C(=O)O')).toBe(6);
    expect(countSmilesAtoms('')).toBe(0);
  });
});
