const rounds = 8;
let limit = 8;

export function data(n, out) {
  for (let i = 0; i < n; i++) out[i] = i;
//^ inspect.unbounded-loop
  while (out[0] < 3) out[0] = out[0] + 1;
//^ inspect.unbounded-loop
  do out[1] = 0; while (out[1] > 0);
//^ inspect.unbounded-loop
  for (const key in out) out[0] = key;
//^ inspect.unbounded-loop
  for (;;) break;
//^ inspect.unbounded-loop
}

export function steady(out) {
  for (let i = 0; i < 8; i++) out[i] = i;
  for (let j = 0; j < rounds; j += 2) out[j] = j;
  for (let k = 7; k >= 0; k--) out[k] = k;
  for (let m = 0; 8 > m; m = m + 1) out[m] = m;
  for (let q = -4; q !== undefined && q < 4; q++) out[0] = q;
//^ inspect.unbounded-loop
  for (let r = 0; r < 8; r++) {
    if (out[r] === 0) continue;
    if (out[r] === 1) break;
  }
}

// The old form: one var, declared before and written by the loop alone.
export function old(out) {
  var i;
  for (i = 0; i < 4; i++) out[i] = i;
  for (i = 0; i < 4; i++) out[i] = -i;
}

export function steps(out, n) {
  for (let i = 0; i < 8; ++i) out[i] = 0;
  for (let i = 8; i > 0; --i) out[i] = 0;
  for (let i = 1; i < 8; i *= 2) out[i] = 0;
//^ inspect.unbounded-loop
  for (let i = 1; i < 8; i = 2 * i) out[i] = 0;
//^ inspect.unbounded-loop
  for (let i = 1; i < 8; i = n) out[i] = 0;
//^ inspect.unbounded-loop
  for (let i = 1; i < 8; n += 1) out[i] = 0;
//^ inspect.unbounded-loop
  for (let i = 1; i < 8; n++) out[i] = 0;
//^ inspect.unbounded-loop
  for (let i = 1; i < 8; ) out[i] = 0;
//^ inspect.unbounded-loop
}

export function index(out) {
  for (let i = 0; i < 8; i++) {
//^ inspect.unbounded-loop
    if (out[i] === 0) i = 0;
  }
  for (let j = 0; j < 8; j--) out[j] = 0;
//^ inspect.unbounded-loop
  for (let k = 0; k < limit; k++) out[k] = 0;
//^ inspect.unbounded-loop
  for (let m = 0; m < 1; m += 0.1) out[0] = m;
//^ inspect.unbounded-loop
  for (let q = 0; q < 8; q += 0) out[q] = q;
//^ inspect.unbounded-loop
}

let shared = 0;
function rewind() {
  shared = 0;
}

// The index is a variable that another function may write.
export function seen() {
  for (shared = 0; shared < 8; shared++) rewind();
//^ inspect.unbounded-loop
}

export function grow() {
  limit = limit + 1;
}
