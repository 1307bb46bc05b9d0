/** What a name itself says of the isomers it stands for (IUPAC recommendations 2013, P-93.1.3: rac, rel). */
import type { IsomerStatement } from '../../notebook/model.ts';

/** `rac-`, `(±)-`, `(RS)-`, `DL-`: both mirror images. `rel-`, `(R*)-`: one of them, not known which. */
export function isomersOfName(name: string): IsomerStatement['kind'] | undefined {
  const start = name.trimStart();
  if (/^(?:rac(?:emic)?[-.\s]|\((?:±|\+\/?[-−–])\)|\(?(?:RS|SR)\)|[Dd][Ll][-–])/.test(start))
    return 'racemate';
  if (/\b\d*(?:RS|SR)\b/.test(start) && !/\b\d*[RS]\b/.test(start)) return 'racemate';
  return /^rel[-.\s]|\b\d*[RS]\*/.test(start) ? 'relative' : undefined;
}
