/** A seeded stream of numbers, uniform in [0, 1): the xoshiro128** generator of Blackman and Vigna (2018). */
export class Random {
  private a: number;
  private b: number;
  private c: number;
  private d: number;

  /** @param seed any integer */
  constructor(seed: number) {
    this.a = seed ^ 0x9e3779b9;
    this.b = Math.imul(seed, 0x85ebca6b) ^ 0x243f6a88;
    this.c = 0x13198a2e;
    this.d = 0x03707344;
    for (let k = 0; k < 16; k++) this.bits();
  }

  /** The next 32 bits. */
  private bits(): number {
    const times5 = Math.imul(this.b, 5);
    const result = Math.imul((times5 << 7) | (times5 >>> 25), 9);
    const shifted = this.b << 9;
    this.c ^= this.a;
    this.d ^= this.b;
    this.b ^= this.c;
    this.a ^= this.d;
    this.c ^= shifted;
    this.d = (this.d << 11) | (this.d >>> 21);
    return result >>> 0;
  }

  /** The next number in [0, 1), with 52 random bits. */
  next(): number {
    return (this.bits() * 2 ** 20 + (this.bits() >>> 12)) * 2 ** -52;
  }

  /** The next whole number in [0, count). */
  below(count: number): number {
    return Math.floor(this.next() * count);
  }

  /** The next number of a normal distribution with mean 0 and deviation 1 (sum of twelve uniform numbers). */
  normal(): number {
    let sum = -6;
    for (let k = 0; k < 12; k++) sum += this.next();
    return sum;
  }
}
