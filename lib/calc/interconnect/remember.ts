/**
 * Computes once what many nets ask for alike (the margins of two families, the load of a bus line): the answers live as
 * long as their owner does. Their sentences cost more than all the joining of nets.
 */
export function remember<Owner extends object, Value>(): (owner: Owner, key: string, compute: () => Value) => Value {
  const owners = new WeakMap<Owner, Map<string, { value: Value }>>();
  return (owner, key, compute) => {
    let known = owners.get(owner);
    if (!known) {
      known = new Map();
      owners.set(owner, known);
    }
    const answer = known.get(key) ?? { value: compute() };
    known.set(key, answer);
    return answer.value;
  };
}
