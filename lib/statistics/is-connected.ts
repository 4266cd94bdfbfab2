/**
 * Whether all levels of two factors hang together through the entries in which they meet, so that differences between
 * levels of one can be told apart from differences between levels of the other.
 *
 * Shape: level numbers from 0, index i of both the same entry. No entries hang together.
 */
export function isConnected(first: readonly number[], second: readonly number[]): boolean {
  const parents = new Map<number, number>();
  let parts = 0;
  const rootOf = (level: number): number => {
    if (!parents.has(level)) {
      parents.set(level, level);
      parts += 1;
    }
    let root = level;
    for (let parent = parents.get(root) ?? root; parent !== root; parent = parents.get(root) ?? root) {
      const above = parents.get(parent) ?? parent;
      parents.set(root, above); // halves the way for the next search
      root = above;
    }
    return root;
  };
  second.forEach((level, index) => {
    const root = rootOf(first[index] ?? 0);
    const otherRoot = rootOf(-1 - level); // below 0, so that the two factors never share a number
    if (root === otherRoot) return;
    parents.set(root, otherRoot);
    parts -= 1;
  });
  return parts <= 1;
}
