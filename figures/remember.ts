/**
 * Gives a way of making something of an object that remembers what was made of it last, for as long as the object lives: what lies beside
 * a moving gain would otherwise be drawn anew in every frame. `placement` is every number that the outcome depends on besides the object.
 */
export function remember<Key extends object, Made>() {
  const memory = new WeakMap<Key, { readonly placement: readonly number[]; readonly made: Made }>();
  return (key: Key, placement: readonly number[], make: () => Made): Made => {
    const last = memory.get(key);
    if (last !== undefined && placement.every((number, i) => Object.is(number, last.placement[i]))) return last.made;
    const made = make();
    memory.set(key, { placement, made });
    return made;
  };
}
