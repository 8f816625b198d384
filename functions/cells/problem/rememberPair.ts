/**
 * The same work, remembering what each pair of objects gave for as long as both exist. It must follow
 * from the two alone.
 */
export function rememberPair<First extends object, Second extends object, Result>(
  work: (first: First, second: Second) => Result,
): (first: First, second: Second) => Result {
  const known = new WeakMap<First, WeakMap<Second, Result>>();
  return (first, second) => {
    let bySecond = known.get(first);
    if (bySecond === undefined) known.set(first, (bySecond = new WeakMap<Second, Result>()));
    let result = bySecond.get(second);
    if (result === undefined) bySecond.set(second, (result = work(first, second)));
    return result;
  };
}
