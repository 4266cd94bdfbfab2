/**
 * Whether all levels of two factors hang together through the entries in which they meet, so that differences between
 * levels of one can be told apart from differences between levels of the other.
 *
 * Shape: level numbers from 0, index i of both the same entry. No entries hang together.
 */
export function isConnected(first: readonly number[], second: readonly number[]): boolean {
  const parents: number[] = [];
  let parts = 0;
  const rootOf = (place: number): number => {
    if (parents[place] === undefined) {
      parents[place] = place;
      parts += 1;
    }
    let root = place;
    for (let parent = parents[root] ?? root; parent !== root; parent = parents[root] ?? root) {
      const above = parents[parent] ?? parent;
      parents[root] = above; // halves the way for the next search
      root = above;
    }
    return root;
  };
  second.forEach((level, index) => {
    const root = rootOf(2 * (first[index] ?? 0)); // even places for one factor, odd ones for the other
    const otherRoot = rootOf(2 * level + 1);
    if (root === otherRoot) return;
    parents[root] = otherRoot;
    parts -= 1;
  });
  return parts <= 1;
}
