import type { Handle } from "./open";

const kept = new WeakMap<Handle, Map<string, unknown>>();
/** A shape beyond these is prepared each time: addresses are made by people, so their number must have an end. */
const MOST_SHAPES = 500;

/**
 * A query that is built and prepared once for each database handle. Building one anew costs many times what running it
 * does, so lists that are asked often go through here.
 * @param shape names the query and whatever of its SQL varies; two queries that differ must not share it
 */
export function preparedOnce<Query>(db: Handle, shape: string, build: () => Query): Query {
  const shapes = kept.get(db) ?? new Map<string, unknown>();
  kept.set(db, shapes);
  // The shape decides what `build` returns, so what is kept under it has the type of this call.
  const ready = shapes.get(shape) as Query | undefined;
  if (ready !== undefined) return ready;
  const query = build();
  if (shapes.size < MOST_SHAPES) shapes.set(shape, query);
  return query;
}
