/**
 * All lawful lines of a person as a layered graph: a line is a path from the start through one node a day,
 * each arc a day off (group 0) or a shift of a group. Only nodes from which a lawful end can be reached are
 * kept, and nodes with the same future are one.
 */
export interface Net {
  readonly dayCount: number;
  readonly groupCount: number;
  /** Nodes before day d are `layers[d]` to `layers[d + 1]`; the last layer holds the ends. */
  readonly layers: Int32Array;
  /** Target of a node and group at `node x groupCount + group`; -1 where no lawful line goes on. */
  readonly next: Int32Array;
  /** What a line that ends in a node has worked; by node - first end node. */
  readonly ends: NetEnds;
}

/** By end node. */
export interface NetEnds {
  readonly minutes: Int32Array;
  /** 0 when the net does not count them. */
  readonly nights: Int32Array;
  readonly weekends: Int32Array;
}

/** The only node of the first layer; a net without any lawful line has no nodes at all. */
export const startNode = 0;

/** Whether there is any lawful line. */
export const hasLine = (net: Net): boolean => net.next.length > 0;

/** First node of the last layer. */
export const firstEnd = (net: Net): number => net.layers[net.dayCount] ?? 0;
