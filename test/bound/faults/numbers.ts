import type { Fault } from '../faulty.ts';

/** Faults of interval arithmetic and of exact numbers. */
export const NUMBERS: readonly Fault[] = [
  {
    name: 'nothing rounded outward',
    file: 'numbers/interval-arithmetic.ts',
    find: 'return x - (Math.abs(x) * ULP + LEAST);',
    replace: 'return x;',
  },
  {
    name: 'a sum rounded inward',
    file: 'numbers/interval-arithmetic.ts',
    find: 'put(r, d, down(r.lo[a]! + r.lo[b]!), up(r.hi[a]! + r.hi[b]!));',
    replace:
      'put(r, d, Math.min(up(r.lo[a]! + r.lo[b]!), down(r.hi[a]! + r.hi[b]!)), down(r.hi[a]! + r.hi[b]!));',
  },
  {
    name: 'a difference of the wrong ends',
    file: 'numbers/interval-arithmetic.ts',
    find: 'down(r.lo[a]! - r.hi[b]!)',
    replace: 'down(r.lo[a]! - r.lo[b]!)',
  },
  {
    name: 'a product with the wrong end',
    file: 'numbers/interval-arithmetic.ts',
    find: 'put(r, d, down(al * bh), up(ah * bh));',
    replace: 'put(r, d, down(al * bh), up(ah * bl));',
  },
  {
    name: 'a quotient with the wrong end',
    file: 'numbers/interval-arithmetic.ts',
    find: 'down(al / (al >= 0 ? bh : bl))',
    replace: 'down(al / (al >= 0 ? bl : bh))',
  },
  {
    name: 'a square root not rounded up',
    file: 'numbers/interval-arithmetic.ts',
    find: 'up(Math.sqrt(r.hi[a]!))',
    replace: 'Math.sqrt(r.hi[a]!)',
  },
  {
    name: 'a square of the smaller end',
    file: 'numbers/interval-arithmetic.ts',
    find: 'put(r, d, 0, Math.max(up(lo * lo), up(hi * hi)))',
    replace: 'put(r, d, 0, Math.min(up(lo * lo), up(hi * hi)))',
  },
  {
    name: 'a choice decided too early',
    file: 'numbers/interval-arithmetic.ts',
    find: 'if (r.hi[a]! < r.lo[b]!) hull(r, d, x, x);',
    replace: 'if (r.lo[a]! < r.lo[b]!) hull(r, d, x, x);',
  },
  {
    name: 'a crest of the sine forgotten',
    file: 'numbers/interval-functions.ts',
    find: 'Math.floor(last) >= first ? 1 : Math.min(1, above(most))',
    replace: 'Math.min(1, above(most))',
  },
  {
    name: 'the sine taken for exact',
    file: 'numbers/interval-functions.ts',
    find: 'Math.min(1, above(most))',
    replace: 'Math.min(1, most)',
  },
  {
    name: 'the angle of the wrong corner',
    file: 'numbers/interval-functions.ts',
    find: 'angleDown(yl, yl >= 0 ? xh : xl)',
    replace: 'angleDown(yl, yl >= 0 ? xl : xh)',
  },
  {
    name: 'half pi cut off after two parts',
    file: 'numbers/proven-sine.ts',
    find: 'r1 - r - w - k * C3',
    replace: 'r1 - r - w',
  },
  {
    name: "Kepler's equation with one eccentricity",
    file: 'numbers/interval-kepler.ts',
    find: 'Math.min(eLo * least, eLo * most, eHi * least, eHi * most)',
    replace: 'Math.min(eLo * least, eLo * most)',
  },
  {
    name: "the sign of Kepler's equation rounded inward",
    file: 'numbers/interval-kepler.ts',
    find: 'return up(up(E - M) - down(product));',
    replace: 'return down(down(E - M) - up(product));',
  },
  {
    name: 'one half of a piece of a polynomial',
    file: 'numbers/rational.ts',
    find: 'pieces.push(piece(onPiece(worst.q, 1n, 2n, 1n)));',
    replace: '',
  },
  {
    name: 'truncation in the part before',
    file: 'numbers/rational.ts',
    find: 'BigInt(2 * j + 1)',
    replace: 'BigInt(Math.max(2 * j - 1, 1))',
  },
];
