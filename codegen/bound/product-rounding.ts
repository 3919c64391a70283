import { halfUnit } from './rounding.ts';

/** Cells of the angle of a product over a quarter turn, and of the difference of its factors' angles. */
const CELLS = { angle: 256, difference: 256 } as const;

/** How far off the unit circle the product and its factors may be, relative. */
const ROOM: Readonly<Record<'f64' | 'f32', number>> = { f64: 2 ** -48, f32: 2 ** -19 };

/** Largest errors of the cosine and of the sine, and of both at once: the length of their vector. */
export interface PairErrors {
  readonly cos: number;
  readonly sin: number;
  readonly both: number;
}

/**
 * Rounding of the product of two turns, cos a cos b - sin a sin b and sin a cos b + cos a sin b: two products and a sum
 * each. Whatever the factors are, with the product's angle p = a + b and d = a - b,
 *
 *     cos a cos b = (cos d + cos p) / 2    sin a sin b = (cos d - cos p) / 2
 *     sin a cos b = (sin p + sin d) / 2    cos a sin b = (sin p - sin d) / 2
 *
 * so that the two products cannot both be large unless their sum is. The table holds the largest error over all d by cells
 * of p over a quarter turn; the sine has that of the complement.
 */
export class ProductRounding {
  private static readonly made = new Map<'f64' | 'f32', ProductRounding>();
  private readonly format: 'f64' | 'f32';
  private readonly cells: Float64Array;
  private readonly whole: PairErrors;

  constructor(format: 'f64' | 'f32') {
    this.format = format;
    this.cells = Float64Array.from({ length: CELLS.angle }, (_, cell) => this.cell(cell));
    this.whole = this.over(0, CELLS.angle - 1);
  }

  /** The table of a format, made when it is first asked for. */
  static of(format: 'f64' | 'f32'): ProductRounding {
    const made = ProductRounding.made.get(format) ?? new ProductRounding(format);
    ProductRounding.made.set(format, made);
    return made;
  }

  /**
   * Largest errors over angles of the product.
   *
   * @param lo least angle, rad
   * @param hi largest angle
   * @param off how far off the unit circle product and factors are
   */
  errors(lo: number, hi: number, off: number): PairErrors {
    if (!(off <= ROOM[this.format])) return { cos: Infinity, sin: Infinity, both: Infinity };
    if (!(hi - lo < Math.PI / 2)) return this.whole;
    const width = Math.PI / 2 / CELLS.angle;
    return this.over(Math.floor(lo / width - 1e-6), Math.floor(hi / width + 1e-6));
  }

  /** Largest errors over cells, those beyond the quarter turn folded back. */
  private over(first: number, last: number): PairErrors {
    let [cos, sin, both] = [0, 0, 0];
    for (let cell = first; cell <= last; cell++) {
      const c = this.cells[folded(cell)]!;
      const s = this.cells[CELLS.angle - 1 - folded(cell)]!;
      cos = Math.max(cos, c);
      sin = Math.max(sin, s);
      both = Math.max(both, c * c + s * s);
    }
    return { cos, sin, both: Math.sqrt(both) * (1 + 2 ** -50) };
  }

  /** Largest error of a cosine whose angle lies in a cell of the quarter turn. */
  private cell(cell: number): number {
    const grow = 1 + 4 * ROOM[this.format];
    const width = Math.PI / 2 / CELLS.angle;
    const [least, most] = [Math.cos((cell + 1) * width) - 1e-12, Math.cos(cell * width) + 1e-12];
    const sum = halfUnit(Math.min(most, 1) * grow, this.format);
    let largest = 0;
    const step = 2 / CELLS.difference;
    for (let k = 0; k < CELLS.difference; k++) {
      const [low, high] = [k * step - 1 - 1e-12, (k + 1) * step - 1 + 1e-12];
      const one = (Math.max(Math.abs(high + most), Math.abs(low + least)) / 2) * grow;
      const other = (Math.max(Math.abs(high - least), Math.abs(low - most)) / 2) * grow;
      largest = Math.max(
        largest,
        halfUnit(Math.min(one, grow), this.format) + halfUnit(Math.min(other, grow), this.format),
      );
    }
    return largest + sum;
  }
}

/** The cell of the quarter turn that has the same cosine up to sign as a cell anywhere. */
function folded(cell: number): number {
  const turn = 2 * CELLS.angle;
  const inside = ((cell % turn) + turn) % turn;
  return inside < CELLS.angle ? inside : turn - 1 - inside;
}
