export async function later(x: number): Promise<number> {
  //   ^ inspect.async
  return x;
}

export const soon = async (x: number): Promise<number> => x;
//                  ^ inspect.async

export function now(x: number): number {
  return x;
}
