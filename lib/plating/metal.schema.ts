import { z } from "zod";
import { InputError } from "@/lib/input-error";
import { parseMetal, type DepositMetal } from "@/lib/plating/metals";

/** A metal as it was typed, and the symbol that it stands for. */
export interface TypedMetal {
  typed: string;
  symbol: DepositMetal;
}

/** A plated metal by symbol or name. Comes out with both, since an answer repeats what was sent. */
export const typedMetal = z
  .string({ error: "Name the metal by its symbol or name, such as Ni or nickel." })
  .transform((typed, context): TypedMetal => {
    try {
      return { typed, symbol: parseMetal(typed) };
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      context.addIssue(error.problem);
      return z.NEVER;
    }
  });
