/** Types are erased: none of these is a call, an array or a template. */
type Vector = [number, number, ...number[]];
type Label = `satellite ${number}`;
interface Out {
  [index: number]: number;
}
declare function outside(x: number): number;
export function overloaded(x: number): number;
export function overloaded(x: string): number;
export function overloaded(x: unknown): number {
  const v = x as [number] as unknown as Vector;
  const n = (v satisfies Vector)[0]!;
  return n + 1;
}
export type Both = Label | Out | typeof outside;
