/** The directives that stand around a table or a caution, written with three colons or more and closed by as many. */
export const containerNames = ['connector', 'components', 'switch', 'wires', 'inside', 'checks', 'hazard'] as const;

/** The directives of one line, written with two colons. */
export const leafNames = ['calculator'] as const;

/** True where a `:::name` is a block of the book; any other directive is ordinary text. */
export function isContainerName(name: string): boolean {
  return (containerNames as readonly string[]).includes(name);
}

/** True where a `::name` is a block of the book. */
export function isLeafName(name: string): boolean {
  return (leafNames as readonly string[]).includes(name);
}
