import tQuantile from '@stdlib/stats-base-dists-t-quantile';
import { finite, notNegative, positive } from './assert';

/** A standard uncertainty with its degrees of freedom; `Infinity` stands for type B. */
export interface Component {
  name: string;
  standard: number;
  dof: number;
}

export interface Combined {
  standard: number;
  effectiveDof: number;
  coverageFactor: number;
  expanded: number;
}

/** Coverage probability of k = 2 for a normal distribution. */
export const COVERAGE = 0.9545;

// From here Student's t and the normal quantile agree to 1e-9, and the library has no infinite dof.
const NORMAL_DOF = 1e9;

// A budget asks for the same few factors again and again, and each takes the library some 0.03 ms.
const MOST_KEPT = 500;
const factors = new Map<string, number>();

/**
 * Coverage factor of Student's t for a two-sided coverage probability (GUM G.3).
 * @throws {RangeError} for a coverage not between 0 and 1, or degrees of freedom not above zero.
 */
export function coverageFactor(dof: number, coverage: number = COVERAGE): number {
  if (!(finite(coverage, 'The coverage') > 0 && coverage < 1)) {
    throw new RangeError(`The coverage must lie between 0 and 1, but is ${coverage}.`);
  }
  if (dof !== Infinity) positive(dof, 'The degrees of freedom');
  const key = `${dof}/${coverage}`;
  const known = factors.get(key);
  if (known !== undefined) return known;
  const factor = tQuantile((1 + coverage) / 2, Math.min(dof, NORMAL_DOF));
  if (factors.size >= MOST_KEPT) factors.clear();
  factors.set(key, factor);
  return factor;
}

/** Standard uncertainty of a rectangular distribution from its half-width (GUM 4.3.7). */
export const rectangular = (halfWidth: number): number =>
  notNegative(halfWidth, 'A half-width') / Math.sqrt(3);

/** Welch-Satterthwaite, truncated to an integer (GUM G.4); `scale` keeps the powers in range. */
function effectiveDofOf(components: readonly Component[], standard: number, scale: number): number {
  let below = 0;
  for (const { standard: u, dof } of components) {
    if (dof !== Infinity) below += (u / scale) ** 4 / dof;
  }
  if (below === 0) return Infinity;
  const exact = (standard / scale) ** 4 / below;
  // 8.999999999 from rounding is nine; the sum is never less than the smallest dof.
  return Math.max(1, Math.floor(exact * (1 + 1e-12)));
}

/**
 * Combined and expanded uncertainty of independent components (GUM, JCGM 100): root sum of squares,
 * Welch-Satterthwaite truncated to an integer, Student's t. All in the unit of the components.
 * @throws {RangeError} for no components, a negative standard uncertainty, degrees of freedom below
 * one, or a coverage that does not lie between 0 and 1.
 */
export function combine(components: readonly Component[], coverage: number = COVERAGE): Combined {
  if (components.length === 0) throw new RangeError('There are no components to combine.');
  for (const { name, standard, dof } of components) {
    notNegative(standard, `The standard uncertainty of ${name}`);
    if (dof !== Infinity && finite(dof, `The degrees of freedom of ${name}`) < 1) {
      throw new RangeError(`The degrees of freedom of ${name} must be at least 1, but are ${dof}.`);
    }
  }
  const standard = Math.hypot(...components.map((component) => component.standard));
  const effectiveDof = standard === 0 ? Infinity : effectiveDofOf(components, standard, standard);
  const factor = coverageFactor(effectiveDof, coverage);
  return { standard, effectiveDof, coverageFactor: factor, expanded: factor * standard };
}
