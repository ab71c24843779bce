import { z } from "zod";
import { requireCase } from "@/db/queries/cases";
import { caseRef } from "@/lib/cases/case.schema";
import { qrCode, qrViewBox } from "@/lib/cases/qr-code";
import { readEnv } from "@/lib/env";
import { routes } from "@/lib/routes";
import { handle } from "@/lib/server/handle";

const DAY_S = 86_400;

/** The QR code of a case as a picture, for a tag that is shown on a phone. */
export const GET = handle({
  permission: "case.see",
  input: z.object({ ref: caseRef }),
  run: ({ member, db, input }) => {
    const { ref } = requireCase(db, member.shopId, input.ref);
    const { size, path } = qrCode(new URL(routes.case(ref), readEnv().NEXTAUTH_URL).href);
    const svg = `<svg xmlns="http://www.w3.org/2000/svg" viewBox="${qrViewBox(size)}" shape-rendering="crispEdges"><path fill="#fff" d="M-4-4h99v99h-99z"/><path d="${path}"/></svg>`;
    return new Response(svg, {
      headers: { "Content-Type": "image/svg+xml", "Cache-Control": `private, max-age=${DAY_S}` },
    });
  },
});
