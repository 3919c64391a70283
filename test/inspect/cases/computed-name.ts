const key = 'sqrtA';
const third = 2;

export function find(o: Record<string, number>, name: string, list: number[], k: number): number {
  const a = o[name];
  //          ^ inspect.computed-name
  const { [name]: b } = o;
  //      ^ inspect.computed-name
  const { [key]: c } = o;
  return a! + b! + c! + o[key]! + o['e']! + list[k]! + list[third]! + list[k + 1]! + list[Math.floor(k)]!;
}
