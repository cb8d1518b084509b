/** @returns the members that have a value: what is left out of a document is not in it as undefined */
export function defined(members: object): object {
  return Object.fromEntries(Object.entries(members).filter(([, value]) => value !== undefined));
}
