import type { SetNode } from "./set-node.ts";

/** Nodes still to be searched; the one of the least bound comes first, of equal ones the earlier. */
export interface NodeQueue {
  heap: SetNode[];
  /** By place in the heap: when the node came. */
  times: number[];
  count: number;
}

/** A queue of nothing. */
export function emptyQueue(): NodeQueue {
  return { heap: [], times: [], count: 0 };
}

/** Puts a node in its place. */
export function addNode(queue: NodeQueue, node: SetNode): void {
  let at = queue.heap.push(node) - 1;
  queue.times.push(queue.count);
  queue.count += 1;
  while (at > 0) {
    const above = (at - 1) >> 1;
    if (!before(queue, at, above)) return;
    swap(queue, at, above);
    at = above;
  }
}

/** Takes out the first node; null: none is left. */
export function takeNode(queue: NodeQueue): SetNode | null {
  const last = queue.heap.length - 1;
  if (last < 0) return null;
  swap(queue, 0, last);
  const node = queue.heap.pop() as SetNode;
  queue.times.pop();
  let at = 0;
  for (;;) {
    let least = at;
    for (const below of [2 * at + 1, 2 * at + 2])
      if (below < last && before(queue, below, least)) least = below;
    if (least === at) return node;
    swap(queue, at, least);
    at = least;
  }
}

function before({ heap, times }: NodeQueue, a: number, b: number): boolean {
  const off = (heap[a] as SetNode).bound - (heap[b] as SetNode).bound;
  return off < 0 || (off === 0 && (times[a] as number) < (times[b] as number));
}

function swap({ heap, times }: NodeQueue, a: number, b: number): void {
  [heap[a], heap[b]] = [heap[b] as SetNode, heap[a] as SetNode];
  [times[a], times[b]] = [times[b] as number, times[a] as number];
}
