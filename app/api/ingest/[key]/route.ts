import { answerIngestCall, answerIngestHead, answerIngestPut } from "@/lib/server/uploads/ingest-route";

/** The stand-in of the hosted upload service. Not a person's route: the signed address, or the service's key, is the permit. */
export const HEAD = answerIngestHead;
export const PUT = answerIngestPut;
export const POST = answerIngestCall;
