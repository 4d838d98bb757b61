/** Keeps what `make` computes from an object for as long as that object lives: several rules share it. */
export function memo<Key extends object, Value>(make: (key: Key) => Value): (key: Key) => Value {
  const made = new WeakMap<Key, { readonly value: Value }>();
  return (key) => {
    const known = made.get(key) ?? { value: make(key) };
    made.set(key, known);
    return known.value;
  };
}
