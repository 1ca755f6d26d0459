import { type BlockDesign } from "./design";

/**
 * The members of one cycle in the order in which they contain each other, the first again at the end; undefined when
 * no block contains itself, directly or through others. Unknown children are passed over.
 */
export function findCycle(blocks: readonly BlockDesign[]): BlockDesign[] | undefined {
  const byId = new Map(blocks.map((block) => [block.id, block]));
  const done = new Set<string>();
  for (const start of blocks) {
    if (done.has(start.id)) continue;
    const cycle = follow(start, byId, done);
    if (cycle) return cycle;
  }
  return undefined;
}

/** Depth first without recursion: a chain of thousands of blocks must not end the stack. */
function follow(start: BlockDesign, byId: Map<string, BlockDesign>, done: Set<string>): BlockDesign[] | undefined {
  const path: { block: BlockDesign; next: number }[] = [{ block: start, next: 0 }];
  const onPath = new Set([start.id]);
  for (let top = path.at(-1); top; top = path.at(-1)) {
    const child = top.block.children[top.next++];
    if (!child) {
      done.add(top.block.id);
      onPath.delete(top.block.id);
      path.pop();
      continue;
    }
    const block = byId.get(child.block);
    if (!block || done.has(block.id)) continue;
    if (onPath.has(block.id)) {
      const from = path.findIndex((step) => step.block.id === block.id);
      return [...path.slice(from).map((step) => step.block), block];
    }
    onPath.add(block.id);
    path.push({ block, next: 0 });
  }
  return undefined;
}
