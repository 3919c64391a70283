const INFIX: Readonly<Record<string, string>> = { add: '+', sub: '-', mul: '*', div: '/' };

/**
 * One operation of a formula or a kernel as ECMAScript; functions are those of Math.
 *
 * @param operation name of an operation on numbers
 * @param args its arguments as text
 */
export function operationText(operation: string, args: readonly string[]): string {
  const [a, b, x, y] = args;
  const sign = INFIX[operation];
  if (sign !== undefined) return `${a} ${sign} ${b}`;
  if (operation === 'neg') return `-${a}`;
  if (operation === 'select') return `${a} < ${b} ? ${x} : ${y}`;
  return `Math.${operation}(${args.join(', ')})`;
}
