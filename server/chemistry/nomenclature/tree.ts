/**
 * The tree of a name: a parent with its endings, and substituents hung on it, each a tree of the same kind. It says
 * what was written, locants missing where none were given; which atoms that can mean is settled when it is built.
 */
import type { SkeletonGraph } from './build/skeleton.ts';
import type { TextRange } from '../text.ts';

/** A locant as written, in one spelling: `2`, `4a`, `1'`, `N`, `N'`, `2-N`, `α`, or `o`, `m`, `p`. */
export type Locant = string;

/** Where a missing locant would be written into the name. */
export interface OpenPlace {
  /** Offset in the prepared text at which the locants are to be put in. */
  readonly at: number;
}

export interface Unsaturation extends OpenPlace {
  readonly order: 2 | 3;
  readonly count: number;
  readonly locants?: readonly Locant[];
  readonly range: TextRange;
}

/** A characteristic group, or free valences (`yl`), named at the end of the parent. */
export interface Ending extends OpenPlace {
  readonly suffix: SuffixEntry;
  readonly count: number;
  readonly locants?: readonly Locant[];
  readonly range: TextRange;
  /** Indicated hydrogen added with the ending, as in `-2(1H)-one` (P-31.1.4.3.4). */
  readonly addedHydrogen?: readonly Locant[];
}

export interface SuffixEntry {
  readonly name: string;
  /**
   * `on`: the group is bound to the atom with the locant; `at`: that carbon becomes part of the group, and lies at an
   * end of a chain; `free`: a free valence; `charge`: a charge on the atom.
   */
  readonly kind: 'on' | 'at' | 'free' | 'charge';
  /**
   * The group: its SMILES, the bond to the parent first. For `at`, what is bound to the carbon: pieces like `=O`,
   * `O`, `N`, parted by spaces. For `free`, the bond order alone; for `charge`, the
   * charge and the change in the number of bonds.
   */
  readonly group: string;
  /** Locants of the group's own atoms in SMILES order (`N`), `-` where there is none. */
  readonly locants?: string;
  /** The group ends in an anion whose oxygen (sulfur, nitrogen) takes the groups of an ester. */
  readonly anion?: boolean;
  /** A form of an anion that only its esters tell apart: `O-ethyl ethanethioate`. */
  readonly estersOnly?: boolean;
  /** Radical, as `oyl`, `carbonyl`: the group has a free valence on its first atom. */
  readonly radical?: boolean;
}

export interface StereoWord {
  /** Locant, or undefined where none was written. */
  readonly locant?: Locant;
  readonly letter:
    | 'R'
    | 'S'
    | 'r'
    | 's'
    | 'E'
    | 'Z'
    | 'M'
    | 'P'
    | 'cis'
    | 'trans'
    | 'exo'
    | 'endo'
    | 'rac'
    | 'rel'
    | 'D'
    | 'L'
    | '+'
    | '-'
    | 'meso';
  readonly range: TextRange;
  /** The descriptors that were written together, with brackets and hyphen. */
  readonly whole: TextRange;
  /** `all-trans`: said of every place. */
  readonly all?: boolean;
  /** One of `RS` and `SR`. */
  readonly either?: boolean;
}

/** One kind of substituent, `count` times, on the atoms of the locants. */
export interface Substitution extends OpenPlace {
  readonly locants?: readonly Locant[];
  readonly count: number;
  readonly unit: Unit;
  readonly range: TextRange;
  /** The group was written without brackets that would belong here, up to the end of `range`. */
  readonly bracketAt?: number;
  /** Where the group itself begins, after locants. */
  readonly bodyAt: number;
  readonly bracketed?: boolean;
}

/** One way of understanding a stretch of substituents; the ways with the lowest cost are meant. */
export interface Grouping {
  readonly substitutions: readonly Substitution[];
  readonly cost: number;
}

/** What joins several like units (`oxydi…`, `methylenebis(…)`; P-15.3), or is continued by one (`phenyleneoxy`). */
export interface Joint extends OpenPlace {
  readonly link: Unit;
  /** What is on the link. */
  readonly unit: Unit;
  /** How many units are on the link; 1 where a divalent group continues it. */
  readonly count: number;
  /** On the units, one each, primed from the second on. */
  readonly locants?: readonly Locant[];
  /** Substituents cited before the link, with primed locants on the units. */
  readonly groupings: readonly (readonly Grouping[])[];
  readonly stereo: readonly StereoWord[];
  readonly range: TextRange;
}

/** Carbon atoms replaced by another element (`oxa`, `azonia`; P-15.4), with bonding numbers where `5λ4-thia` says so. */
export interface Replacement {
  readonly atomicNumber: number;
  readonly charge?: number;
  readonly locants: readonly Locant[];
  readonly bonding?: readonly (number | undefined)[];
  readonly range: TextRange;
}

export interface BondingNumber {
  readonly locant?: Locant;
  readonly bonds: number;
}

/** The acyclic half of a conjunctive name, bound to the ring that is named first: `1H-indole-3-acetic acid`. */
export interface SideChain {
  readonly unit: Unit;
  readonly count: number;
  /** On the ring. */
  readonly locants?: readonly Locant[];
  readonly range: TextRange;
}

export interface Unit {
  /** The skeletons that the parent's name can mean, with what tells them apart in a completed name. */
  readonly skeletons: readonly SkeletonGraph[];
  readonly replacements: readonly Replacement[];
  /** Bonding numbers written before the parent (`λ5-phosphane`; P-14.1), without locant for its only atom. */
  readonly bonding?: readonly BondingNumber[];
  readonly unsaturations: readonly Unsaturation[];
  readonly endings: readonly Ending[];
  readonly hydro: readonly { locants?: readonly Locant[]; count: number; at: number; range: TextRange }[];
  readonly indicated: readonly Locant[];
  readonly stereo: readonly StereoWord[];
  /** Stretches of substituents; for each the ways of understanding it. */
  readonly groupings: readonly (readonly Grouping[])[];
  readonly range: TextRange;
  /** Where the parent's own word begins. */
  readonly parentAt: number;
  /** An amino acid, or its acyl group, which the group of another before it acylates (P-103.3). */
  readonly residue?: boolean;
  /** Free valences of a radical that its vocabulary entry fixed: atom of the skeleton and bond order. */
  readonly attach?: { readonly atom: number; readonly order: 1 | 2 | 3; readonly count?: number };
  /** Atoms of the skeleton with a free valence each, where the group joins several others. */
  readonly links?: readonly number[];
  readonly sideChain?: SideChain;
  /** A word such as `oxime`, and what kind of compound it is derived from. */
  readonly derivativeOf?: 'carbonyl' | 'acid';
  /** The unit stands several times round a linking group, or continues one. */
  readonly joint?: Joint;
  /** Atom of the skeleton that takes the substituent of a linking group (`oxy`, `carbonyl`, `amino`). */
  readonly linkAt?: number;
  /** The linking group cannot stand without a substituent. */
  readonly needsLink?: boolean;
  /** An anion that is part of the entry (`acetate` is an ending, `nitrate` an entry): atoms with ester places. */
  readonly sites?: readonly number[];
}
