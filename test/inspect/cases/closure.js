// An arrow at module level exists once.
export const double = (x) => 2 * x;

export function make(k) {
  return function (x) {
    //   ^ inspect.closure
    return k * x;
  };
}

export function arrow(k) {
  const scale = (x) => k * x;
  //            ^ inspect.closure
  return scale(2);
}

export function declared(k) {
  function scale(x) {
//^ inspect.closure
    return k * x;
  }
  return scale(2);
}

// Runs once, while the file loads; what it declares exists once, too.
const api = (function () {
  const unit = { k: 1 };
  function scale(x) {
    return unit.k * x;
  }
  return { scale };
})();
export const scale = api.scale;
