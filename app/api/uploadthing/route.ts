import { answerKitRequest } from "@/lib/server/uploads/kit-route";

/** The upload service's own kit: the phone asks here where to send a photo; the hosted service calls back here. */
export const GET = answerKitRequest;
export const POST = answerKitRequest;
