import { inspectAdvice } from "@/lib/costs/inspect";
import { inspectAnswer, inspectInput } from "@/lib/costs/inspect.schema";
import { handle } from "@/lib/server/handle";

/** Is looking at every strike worth it? All, none, or too few runs to say. */
export const POST = handle({
  permission: "strip.estimate",
  input: inspectInput,
  run: ({ input }) => {
    const { rate = null, ...answer } = inspectAdvice(input);
    return inspectAnswer.parse({ given: input, rate, ...answer });
  },
});
