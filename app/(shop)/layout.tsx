import type { ReactNode } from "react";
import { SnapOutboxFlusher } from "@/components/cases/snap-outbox-flusher";
import { UploadStatus } from "@/components/photos/upload-status";
import { currentMember } from "@/lib/server/session";

/** What stays while people move between pages: photos and snaps that go on going up. Not a guard; each page guards itself. */
export default async function ShopLayout({ children }: { children: ReactNode }) {
  const member = await currentMember();
  return (
    <>
      {children}
      {member && <UploadStatus memberId={member.memberId} />}
      {member && <SnapOutboxFlusher memberId={member.memberId} />}
    </>
  );
}
