import type { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import { type ExactRule, exactRule } from './rule.ts';

const ANGLE = { min: -10, max: 10 };
const ECCENTRICITY = { min: 0, max: 0.99 };

function turnOf(graph: Graph, angle: Node): readonly [cos: Node, sin: Node] {
  return [graph.make('cos', angle), graph.make('sin', angle)];
}

/** cos(a + b) = cos a cos b - sin a sin b, sin(a + b) = sin a cos b + cos a sin b; given the turns of a and b. */
export const sumOfAngles: ExactRule = exactRule({
  name: 'sum of angles',
  law: {
    free: [ANGLE, ANGLE],
    original: (graph, [a, b]) => turnOf(graph, graph.make('add', a!, b!)),
    given: (graph, [a, b]) => [...turnOf(graph, a!), ...turnOf(graph, b!)],
  },
  apply: (graph, [cosA, sinA, cosB, sinB]) => [
    graph.make('sub', graph.make('mul', cosA!, cosB!), graph.make('mul', sinA!, sinB!)),
    graph.make('add', graph.make('mul', sinA!, cosB!), graph.make('mul', cosA!, sinB!)),
  ],
});

/** cos(-a) = cos a, sin(-a) = -sin a; given the turn of a. */
export const oppositeAngle: ExactRule = exactRule({
  name: 'opposite angle',
  law: {
    free: [ANGLE],
    original: (graph, [a]) => turnOf(graph, graph.make('neg', a!)),
    given: (graph, [a]) => turnOf(graph, a!),
  },
  apply: (graph, [cos, sin]) => [cos!, graph.make('neg', sin!)],
});

/** cos 2a = 1 - (2 sin a) sin a, sin 2a = (2 sin a) cos a; given the turn of a. */
export const doubleAngle: ExactRule = exactRule({
  name: 'double angle',
  law: {
    free: [ANGLE],
    original: (graph, [a]) => turnOf(graph, graph.make('mul', graph.constant(2), a!)),
    given: (graph, [a]) => turnOf(graph, a!),
  },
  apply: (graph, [cos, sin]) => {
    const twice = graph.make('add', sin!, sin!);
    return [
      graph.make('sub', graph.constant(1), graph.make('mul', twice, sin!)),
      graph.make('mul', twice, cos!),
    ];
  },
});

/** The direction of (x, y): cos = x / h, sin = y / h with h = sqrt(x^2 + y^2); given x and y. */
export const direction: ExactRule = exactRule({
  name: 'direction of a point',
  law: {
    free: [
      { min: -5, max: 5 },
      { min: -5, max: 5 },
    ],
    original: (graph, [x, y]) => turnOf(graph, graph.make('atan2', y!, x!)),
    given: (_, free) => free,
  },
  apply: (graph, [x, y]) => {
    const squares = graph.make('add', graph.make('mul', x!, x!), graph.make('mul', y!, y!));
    const inverse = graph.make('div', graph.constant(1), graph.make('sqrt', squares));
    return [graph.make('mul', x!, inverse), graph.make('mul', y!, inverse)];
  },
});

/**
 * The direction of (cos E - e, sqrt(1 - e^2) sin E) needs no root, since (sqrt(1 - e^2) sin E)^2 + (cos E - e)^2 =
 * (1 - e cos E)^2; given the point, cos E and e.
 */
export const trueAnomaly: ExactRule = exactRule({
  name: 'true anomaly',
  law: {
    free: [ANGLE, ECCENTRICITY],
    original: (graph, free) => {
      const [x, y] = pointOfOrbit(graph, free);
      return turnOf(graph, graph.make('atan2', y, x));
    },
    given: (graph, free) => [...pointOfOrbit(graph, free), graph.make('cos', free[0]!), free[1]!],
  },
  apply: (graph, [x, y, cosE, e]) => {
    const slope = graph.make('sub', graph.constant(1), graph.make('mul', e!, cosE!));
    const inverse = graph.make('div', graph.constant(1), slope);
    return [graph.make('mul', x!, inverse), graph.make('mul', y!, inverse)];
  },
});

function pointOfOrbit(graph: Graph, [E, e]: readonly Node[]): readonly [Node, Node] {
  const root = graph.make('sqrt', graph.make('sub', graph.constant(1), graph.make('mul', e!, e!)));
  return [graph.make('sub', graph.make('cos', E!), e!), graph.make('mul', root, graph.make('sin', E!))];
}

/** E = M + D with D = e sin(M + D); given M, the turn of M and e. */
export const eccentricAnomaly: ExactRule = exactRule({
  name: 'eccentric anomaly',
  law: {
    free: [{ min: -3, max: 3 }, ECCENTRICITY],
    original: (graph, [M, e]) => [graph.make('kepler', M!, e!)],
    given: (graph, [M, e]) => [M!, ...turnOf(graph, M!), e!],
  },
  apply: (graph, [M, cosM, sinM, e]) => [graph.make('add', M!, graph.make('offset', sinM!, cosM!, e!))],
});

/** (a b) c = (a c) b: the factors that setup knows are multiplied there; given the factors of a product. */
export const regroupedProduct: ExactRule = exactRule({
  name: 'regrouped product',
  law: {
    free: [
      { min: -5, max: 5, stage: 'setup' },
      { min: -5, max: 5, stage: 'tick' },
      { min: -5, max: 5, stage: 'setup' },
      { min: -5, max: 5, stage: 'tick' },
    ],
    original: (graph, free) => [free.reduce((a, b) => graph.make('mul', a, b))],
    given: (_, free) => free,
  },
  apply: (graph, factors) => {
    const product = (list: readonly Node[]) => list.reduce((a, b) => graph.make('mul', a, b));
    const early = factors.filter((factor) => factor.stage !== 'tick');
    return [graph.make('mul', product(early), product(factors.filter((factor) => factor.stage === 'tick')))];
  },
});
