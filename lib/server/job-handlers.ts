import "server-only";
import { givePhotoUp, photoSizesJob } from "./images/photo-sizes-job";
import type { JobHandlers } from "./job-runner";
import { secondLookDigestJob } from "./mail/second-look-digest";
import { sendMailJob } from "./mail/send-mail-job";

/** What each kind of job does. A new kind does not compile until it is named here. */
export const jobHandlers: JobHandlers = {
  "photo-sizes": { run: photoSizesJob, giveUp: givePhotoUp },
  "send-mail": { run: sendMailJob },
  "second-look-digest": { run: secondLookDigestJob },
};
