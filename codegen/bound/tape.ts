import type { Format } from '../kernel/choices.ts';

/** Local error of a sine and cosine that a block of lines computes, by angle: see sine-block.ts. */
export interface SineErrors {
  /** Whether an angle may be given in any turn: the block reduces it. */
  readonly periodic: boolean;
  /** Largest |computed - cos| for angles in an interval, rad. */
  cos(lo: number, hi: number): number;
  /** Largest |computed - sin| for angles in an interval, rad. */
  sin(lo: number, hi: number): number;
  /** Largest length of both errors at once, for angles in an interval, rad. */
  both(lo: number, hi: number): number;
}

/** Local error of a capped solver, by mean anomaly and eccentricity: see solver-block.ts. */
export interface SolverErrors {
  /** Largest |computed - exact| of E - M for intervals of M (any turn) and e, rad. */
  offset(M: Span, e: Span): number;
}

/** Rounding errors of the lines of a product of turns, from the ranges of what they read. */
export interface ProductErrors {
  /** Entries that the lines read, with the component for a turn. */
  readonly reads: readonly { readonly entry: number; readonly component: 'value' | 'sine' }[];
  /** Largest rounding error of the cosine and of the sine for ranges of what is read. */
  errors(lo: readonly number[], hi: readonly number[]): readonly number[];
}

/** A closed interval. */
export interface Span {
  readonly lo: number;
  readonly hi: number;
}

/** Kinds of entries that are real numbers and computed by one line from other real numbers. */
export type RealKind = 'add' | 'sub' | 'mul' | 'div' | 'neg' | 'sqrt' | 'abs' | 'floor' | 'select' | 'round';

interface Common {
  /** Line of the kernel that computes the entry; -1 where none does. For turns the line of the cosine. */
  readonly line: number;
}

/**
 * One step of an analysis. Arguments are indices of earlier entries. A turn is a point next to the unit circle,
 * carried as an angle and a small deviation; `cosine` and `sine` are its components.
 */
export type Entry = Common &
  (
    | { readonly kind: 'input'; readonly name: string }
    | { readonly kind: 'constant'; readonly value: number; readonly error: number }
    | { readonly kind: RealKind; readonly args: readonly number[]; readonly format: Format | 'exact' }
    | {
        readonly kind: 'turn';
        readonly angle: number;
        readonly errors: SineErrors | null;
        readonly sinLine: number;
      }
    | {
        readonly kind: 'product';
        readonly args: readonly [number, number];
        readonly format: Format | 'exact';
        readonly sinLine: number;
        /** Rounding of lines that compute the product in another order; null where they are products and sums as they stand. */
        readonly errors: ProductErrors | null;
      }
    | { readonly kind: 'pair'; readonly args: readonly [number, number] }
    | {
        readonly kind: 'anomaly';
        readonly turn: number;
        readonly e: number;
        readonly root: number;
        /** Entries of its cosine and sine as the lines compute them; their errors count, what they depend on does not. */
        readonly lines: readonly [number, number];
      }
    | { readonly kind: 'leaf'; readonly of: number; readonly component: 'value' | 'sine' }
    | { readonly kind: 'rounded-turn'; readonly turn: number; readonly sinLine: number }
    | { readonly kind: 'cosine' | 'sine'; readonly turn: number }
    | {
        readonly kind: 'offset';
        readonly turn: number;
        readonly e: number;
        readonly format: Format;
        readonly errors: SolverErrors | null;
      }
  );

/**
 * A rotation about the third axis that makes the first two outputs of a group from two numbers, X cos - Y sin and
 * X sin + Y cos. Errors are then taken in the frame that turns with it: lengths do not change.
 */
export interface NodeFrame {
  readonly X: number;
  readonly Y: number;
  readonly turn: number;
  readonly format: Format;
}

/**
 * A full chain of rotations, as of an orbit: X = r cos u, y = r sin u, Y = y cos i, Z = y sin i, and then the rotation
 * of the node frame. Errors are taken radial, along and across the orbital plane.
 */
export interface OrbitFrame {
  readonly r: number;
  readonly u: number;
  readonly i: number;
  readonly y: number;
  readonly Z: number;
}

/**
 * An analysis as a list of entries, arguments before users, and its outputs: entries whose errors make up the error
 * vector. In an orbit frame the vector has the three axes of the orbit, and the four products that make it are no
 * further taken apart.
 */
export interface Tape {
  readonly entries: readonly Entry[];
  readonly outputs: readonly number[];
  readonly node: NodeFrame | null;
  readonly orbit: OrbitFrame | null;
}
