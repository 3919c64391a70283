/** A vector of three components. */
export type Vector = readonly [number, number, number];

/** A triangle of directions, and the triangles that it is divided into. */
interface Face {
  readonly corners: readonly [number, number, number];
  /** Distance of the plane of its corners from the centre. */
  readonly distance: number;
  readonly parts: readonly Face[];
}

/** How often the faces of the icosahedron are divided at most. */
const DEPTH = 4;

/** A face is divided while it may hold a maximum that is above the largest value known by this share. */
const CLOSE = 1.002;

/** Directions: corners of the icosahedron's faces and of their parts, one of each opposite pair. */
const directions: Vector[] = [];
const places = new Map<string, number>();
const faces: readonly Face[] = makeFaces();
const values = new Float64Array(directions.length);
const known = new Uint32Array(directions.length);
let round = 0;

/**
 * Bound on the maximum over the sphere of a convex, homogeneous and even function, and a direction in which it nearly is.
 * In a triangle of directions it is at most its largest value at the corners over the distance of the corners' plane from
 * the centre; triangles that may hold the maximum are divided.
 *
 * @param value the function
 */
export function sphereMaximum(value: (direction: Vector) => number): { bound: number; direction: Vector } {
  round++;
  let largest = 0;
  let best = 0;
  const at = (corner: number): number => {
    if (known[corner] === round) return values[corner]!;
    known[corner] = round;
    const found = value(directions[corner]!);
    values[corner] = found;
    if (!(found <= largest)) [largest, best] = [found, corner];
    return found;
  };
  const most = ({ corners, distance }: Face): number =>
    Math.max(at(corners[0]), at(corners[1]), at(corners[2])) / distance;
  for (const face of faces) most(face);
  let bound = largest;
  const visit = (face: Face): void => {
    const here = most(face);
    if (face.parts.length === 0 || !(here > largest * CLOSE)) bound = Math.max(bound, here);
    else for (const part of face.parts) visit(part);
  };
  for (const face of faces) visit(face);
  return { bound: bound * (1 + 1e-12), direction: directions[best]! };
}

/** The faces of the icosahedron on one half of the sphere: triples of corners next to each other, up to sign. */
function makeFaces(): readonly Face[] {
  const g = (1 + Math.sqrt(5)) / 2;
  const corners: Vector[] = [];
  for (const a of [-1, 1]) for (const b of [-g, g]) corners.push([0, a, b], [a, b, 0], [b, 0, a]);
  const list = corners.map(unit);
  const near = (a: Vector, b: Vector) => dot(a, b) > 0.4 && dot(a, b) < 0.5;
  const made: Face[] = [];
  for (const [i, a] of list.entries()) {
    for (const [j, b] of list.entries()) {
      for (const [k, c] of list.entries()) {
        const upper =
          dot([a[0] + b[0] + c[0], a[1] + b[1] + c[1], a[2] + b[2] + c[2]], [0.31, 0.5, 0.83]) > 0;
        if (i < j && j < k && near(a, b) && near(b, c) && near(a, c) && upper) made.push(face(a, b, c, 0));
      }
    }
  }
  return made;
}

function face(a: Vector, b: Vector, c: Vector, depth: number): Face {
  const [ab, bc, ca] = [middle(a, b), middle(b, c), middle(c, a)];
  const parts =
    depth === DEPTH
      ? []
      : [
          face(a, ab, ca, depth + 1),
          face(b, bc, ab, depth + 1),
          face(c, ca, bc, depth + 1),
          face(ab, bc, ca, depth + 1),
        ];
  return { corners: [place(a), place(b), place(c)], distance: distance(a, b, c), parts };
}

/** The number of a direction: opposite directions have the same. */
function place(direction: Vector): number {
  const key = (sign: 1 | -1) => direction.map((part) => Math.round(sign * part * 1e9) + 0).join(' ');
  const found = places.get(key(1)) ?? places.get(key(-1));
  if (found !== undefined) return found;
  places.set(key(1), directions.length);
  return directions.push(direction) - 1;
}

function distance(a: Vector, b: Vector, c: Vector): number {
  const u: Vector = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  const v: Vector = [c[0] - a[0], c[1] - a[1], c[2] - a[2]];
  const normal = unit([u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]]);
  return Math.abs(dot(normal, a));
}

function middle(a: Vector, b: Vector): Vector {
  return unit([a[0] + b[0], a[1] + b[1], a[2] + b[2]]);
}

function dot(a: Vector, b: Vector): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

function unit(a: Vector): Vector {
  const length = Math.sqrt(dot(a, a));
  return [a[0] / length, a[1] / length, a[2] / length];
}
