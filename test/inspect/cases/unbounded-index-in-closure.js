export function hidden() {
  for (let i = 0; i < 8; i++) {
//^ inspect.unbounded-loop
    const back = () => {
      //         ^ inspect.closure
      i = 0;
    };
    back();
  }
}
