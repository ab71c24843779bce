import "server-only";
import type { NextRequest } from "next/server";
import { FAULT_STATUS } from "@/lib/fault";
import { demand, faultOf } from "@/lib/server/faults";
import { currentMember } from "@/lib/server/session";
import { nameSender } from "./photo-handler";
import { uploadDesk } from "./upload-desk";

/**
 * The kit's route. A person's request needs the permission to add photos; the service's callback carries a signature,
 * which the kit checks. A refusal is said in the kit's shape, with our sentence as `detail`.
 */
export async function answerKitRequest(request: NextRequest): Promise<Response> {
  try {
    if (!request.headers.has("uploadthing-hook")) {
      nameSender(request, demand(await currentMember(), "photo.add"));
    }
    return await uploadDesk().kit(request);
  } catch (error) {
    const { code, message, ref } = faultOf(error, "upload kit");
    return Response.json({ message, detail: message, code, ref }, { status: FAULT_STATUS[code] });
  }
}
