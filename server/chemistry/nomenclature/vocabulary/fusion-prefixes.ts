/**
 * Ring names contracted where they are prefixes of a fusion name (P-25.3.2.2.2); every other ring takes `o` in place of
 * its final e by rule (`indeno`, `pyrazino`, `oxazolo`). The elided `benz` and `naphth` are usage before a vowel or a
 * fusion descriptor (1979 rules, A-21.4).
 * Each line: prefix, the ring's name without final e; more locants of the ring may stand in brackets before it.
 */
export const contractedFusionPrefixes: readonly (readonly [prefix: string, ring: string])[] = [
  ['acenaphtho', 'acenaphthylen'],
  ['anthra', 'anthracen'],
  ['benz', 'benzen'],
  ['benzo', 'benzen'],
  ['benzofuro', 'benzofuran'],
  ['benzimidazo', 'benzimidazol'],
  ['benzothieno', 'benzothiophen'],
  ['benzopyrano', 'benzopyran'],
  ['furo', 'furan'],
  ['imidazo', 'imidazol'],
  ['isobenzofuro', 'isobenzofuran'],
  ['isoquino', 'isoquinolin'],
  ['naphth', 'naphthalen'],
  ['naphtho', 'naphthalen'],
  ['perylo', 'perylen'],
  ['phenanthro', 'phenanthren'],
  ['pyrido', 'pyridin'],
  ['pyrimido', 'pyrimidin'],
  ['quino', 'quinolin'],
  ['thieno', 'thiophen'],
];
