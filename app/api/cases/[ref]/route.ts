import { z } from "zod";
import { getCaseMoney } from "@/db/queries/case-costs";
import { requireCaseFacts } from "@/db/queries/case-page";
import {
  listCaseCalls,
  listCaseCards,
  listCaseEvents,
  listCaseShots,
  listCaseSolutions,
} from "@/db/queries/case-records";
import { caseRef } from "@/lib/cases/case.schema";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import { handle } from "@/lib/server/handle";

/** A case whole. The money is in it only for those who may see it. */
export const GET = handle({
  permission: "case.see",
  input: z.object({ ref: caseRef }),
  run: ({ member, db, input }) => {
    const { shopId } = member;
    const { id, ...facts } = requireCaseFacts(db, shopId, input.ref);
    return {
      ...facts,
      solutions: listCaseSolutions(db, shopId, id),
      photos: listCaseShots(db, shopId, id).map((shot) => ({
        ...shot,
        url: shot.state === "ready" ? routes.photo(shot.id, "view") : null,
      })),
      calls: listCaseCalls(db, shopId, id),
      history: listCaseEvents(db, shopId, id),
      cards: listCaseCards(db, shopId, id),
      ...(can(member, "money.case") ? { money: getCaseMoney(db, shopId, id) } : {}),
    };
  },
});
