export class Tree {
  left: Tree | null = null;
  depth(): number {
    return this.left === null ? 0 : this.left.depth();
    //                                        ^ inspect.outside-call inspect.recursion
  }
}

export const again = function walk(n: number): number {
  return n > 0 ? walk(n - 1) : 0;
  //             ^ inspect.recursion
};
