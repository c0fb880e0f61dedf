/** Adds to the list of a key, in place: lists grow long, and a copy for every item would take a time that grows with their square. */
export function addToList<K, V>(lists: Map<K, V[]>, key: K, item: V): void {
  const list = lists.get(key);
  if (list) list.push(item);
  else lists.set(key, [item]);
}
