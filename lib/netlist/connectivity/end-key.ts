/** An end that wires meet at: a pin of a part, or a junction. Made by `pinEnd` and `junctionEnd` only. */
export type EndKey = string & { readonly brand: 'EndKey' };

export function pinEnd(partId: string, pin: string): EndKey {
  return `pin\u0000${partId}\u0000${pin}` as EndKey;
}

export function junctionEnd(junctionId: string): EndKey {
  return `junction\u0000${junctionId}` as EndKey;
}
