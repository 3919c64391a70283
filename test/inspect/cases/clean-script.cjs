'use strict';
var fround = Math.fround;
var rounds = 3;
function position(t, state, out) {
  var i;
  var x = t;
  for (i = 0; i < rounds; i += 1) x = fround(x * state[i]);
  out[0] = x;
  return 0;
}
module.exports = { position: position };
