import { stripAnswer, stripInput } from "@/lib/costs/strip.schema";
import { estimateStrip } from "@/lib/server/costs/estimate-strip";
import { handle } from "@/lib/server/handle";

/** What taking a deposit off costs, way by way, and what the same fault costs at the strike. Money in minor units. */
export const POST = handle({
  permission: "strip.estimate",
  input: stripInput,
  run: ({ db, member, input, now }) => stripAnswer.parse(estimateStrip(db, member, input, now)),
});
