export function find(state, k) {
  for (let i = 0; i < 4; i++) state[i + 1] = state[2 * i];
  return state[k];
  //           ^ inspect.computed-name
}

/** @param {number} k */
export function documented(state, k) {
  return state[k] + state[k - 1] + state[-1];
}
