/** A vector of three components. */
export type Vector = readonly [number, number, number];

/** Directions that cover the sphere up to sign, and how much a bound over them must grow to hold for all. */
export interface Net {
  readonly directions: readonly Vector[];
  /** 1 / (distance of the nearest face of their convex hull from the centre). */
  readonly factor: number;
}

/**
 * The vertices of an icosahedron whose faces are divided into four, twice, one of each opposite pair. The maximum of
 * a convex, homogeneous and even function over the sphere is at most `factor` times its maximum over the net, since
 * the ball of radius 1 / factor lies inside the hull of the net.
 */
export const NET: Net = makeNet(2);

function makeNet(divisions: number): Net {
  const g = (1 + Math.sqrt(5)) / 2;
  const corners: Vector[] = [];
  for (const a of [-1, 1]) for (const b of [-g, g]) corners.push([0, a, b], [a, b, 0], [b, 0, a]);
  let faces = triangles(corners.map(unit));
  for (let k = 0; k < divisions; k++) faces = faces.flatMap(divide);
  const directions: Vector[] = [];
  for (const vertex of faces.flat()) {
    if (!directions.some((other) => Math.abs(Math.abs(dot(vertex, other)) - 1) < 1e-9))
      directions.push(vertex);
  }
  const nearest = Math.min(...faces.map(faceDistance));
  return { directions, factor: (1 / nearest) * (1 + 1e-12) };
}

/** The faces of the icosahedron: triples of corners next to each other. */
function triangles(corners: readonly Vector[]): (readonly [Vector, Vector, Vector])[] {
  const near = (a: Vector, b: Vector) => dot(a, b) > 0.4 && dot(a, b) < 0.5;
  const faces: (readonly [Vector, Vector, Vector])[] = [];
  for (const [i, a] of corners.entries()) {
    for (const [j, b] of corners.entries()) {
      for (const [k, c] of corners.entries()) {
        if (i < j && j < k && near(a, b) && near(b, c) && near(a, c)) faces.push([a, b, c]);
      }
    }
  }
  return faces;
}

function divide([a, b, c]: readonly [Vector, Vector, Vector]): (readonly [Vector, Vector, Vector])[] {
  const [ab, bc, ca] = [middle(a, b), middle(b, c), middle(c, a)];
  return [
    [a, ab, ca],
    [b, bc, ab],
    [c, ca, bc],
    [ab, bc, ca],
  ];
}

function faceDistance([a, b, c]: readonly [Vector, Vector, Vector]): number {
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
