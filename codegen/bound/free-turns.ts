import type { Tape } from './tape.ts';

/**
 * Turns about the third axis of the outputs, by entry: nothing else depends on their angle, and errors are taken in the
 * frame that turns with them. So the angle may be any, and no box needs to say which.
 */
export function freeTurns(tape: Tape): readonly boolean[] {
  const free = tape.entries.map(() => false);
  const mark = (k: number): void => {
    const entry = tape.entries[k]!;
    if (entry.kind === 'turn') free[k] = entry.errors?.periodic === true;
    if (entry.kind === 'product' || entry.kind === 'rounded-turn') {
      free[k] = true;
      (entry.kind === 'product' ? entry.args : [entry.turn]).forEach(mark);
    }
  };
  if (tape.node !== null) mark(tape.node.turn);
  return free;
}
