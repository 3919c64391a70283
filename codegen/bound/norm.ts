/** A vector of three components. */
export type Vector = readonly [number, number, number];

/** How often the faces of the icosahedron are divided at most. */
const DEPTH = 4;

/** A face is divided while it may hold a maximum that is above the largest value known by this share. */
const CLOSE = 1.002;

/** A direction, and the value there in the last search that came to it. */
interface Corner {
  readonly direction: Vector;
  value: number;
  search: number;
}

/** A triangle of directions. */
class Face {
  readonly corners: readonly [Corner, Corner, Corner];
  /** Distance of the plane of its corners from the centre. */
  readonly distance: number;
  private readonly directions: readonly [Vector, Vector, Vector];
  private readonly depth: number;
  private divided: readonly Face[] | undefined;

  constructor(a: Vector, b: Vector, c: Vector, depth: number) {
    this.directions = [a, b, c];
    this.corners = [corner(a), corner(b), corner(c)];
    this.distance = distance(a, b, c);
    this.depth = depth;
  }

  /** The triangles that it is divided into, made when they are first asked for; none at the last depth. */
  get parts(): readonly Face[] {
    this.divided ??= this.depth === DEPTH ? [] : this.divide();
    return this.divided;
  }

  private divide(): readonly Face[] {
    const [a, b, c] = this.directions;
    const [ab, bc, ca] = [middle(a, b), middle(b, c), middle(c, a)];
    const depth = this.depth + 1;
    return [
      new Face(a, ab, ca, depth),
      new Face(b, bc, ab, depth),
      new Face(c, ca, bc, depth),
      new Face(ab, bc, ca, depth),
    ];
  }
}

/** Corners of faces by their direction, one of each opposite pair. */
const corners = new Map<string, Corner>();
const faces: readonly Face[] = makeFaces();
let searches = 0;

/**
 * Bound on the maximum over the sphere of a convex, homogeneous and even function, and a direction in which it nearly is.
 * In a triangle of directions it is at most its largest value at the corners over the distance of the corners' plane from
 * the centre; triangles that may hold the maximum are divided.
 *
 * @param value the function
 */
export function sphereMaximum(value: (direction: Vector) => number): { bound: number; direction: Vector } {
  const search = ++searches;
  let best = faces[0]!.corners[0];
  let largest = 0;
  const at = (place: Corner): number => {
    if (place.search === search) return place.value;
    place.search = search;
    place.value = value(place.direction);
    if (!(place.value <= largest)) [largest, best] = [place.value, place];
    return place.value;
  };
  const most = ({ corners: [a, b, c], distance }: Face): number => Math.max(at(a), at(b), at(c)) / distance;
  for (const face of faces) most(face);
  let bound = largest;
  const visit = (face: Face): void => {
    const here = most(face);
    if (here > largest * CLOSE && face.parts.length > 0) for (const part of face.parts) visit(part);
    else bound = Math.max(bound, here);
  };
  for (const face of faces) visit(face);
  return { bound: bound * (1 + 1e-12), direction: best.direction };
}

/** The faces of the icosahedron on one half of the sphere: triples of corners next to each other, up to sign. */
function makeFaces(): readonly Face[] {
  const g = (1 + Math.sqrt(5)) / 2;
  const list: Vector[] = [];
  for (const a of [-1, 1])
    for (const b of [-g, g]) list.push(unit([0, a, b]), unit([a, b, 0]), unit([b, 0, a]));
  const near = (a: Vector, b: Vector) => dot(a, b) > 0.4 && dot(a, b) < 0.5;
  const made: Face[] = [];
  for (const [i, a] of list.entries()) {
    for (const [j, b] of list.entries()) {
      for (const [k, c] of list.entries()) {
        const upper =
          dot([a[0] + b[0] + c[0], a[1] + b[1] + c[1], a[2] + b[2] + c[2]], [0.31, 0.5, 0.83]) > 0;
        if (i < j && j < k && near(a, b) && near(b, c) && near(a, c) && upper)
          made.push(new Face(a, b, c, 0));
      }
    }
  }
  return made;
}

/** The corner in a direction; opposite directions have the same. */
function corner(direction: Vector): Corner {
  const key = (sign: 1 | -1) => direction.map((part) => Math.round(sign * part * 1e9) + 0).join(' ');
  const known = corners.get(key(1)) ?? corners.get(key(-1));
  if (known !== undefined) return known;
  const made: Corner = { direction, value: 0, search: 0 };
  corners.set(key(1), made);
  return made;
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
