import type { ReactNode } from "react";
import { JournalShell } from "@/components/journal-shell";
import { journalHeader } from "@/features/days/queries/journal-header";
import { forPage } from "@/lib/action";

export default async function JournalLayout({
  children, params,
}: Readonly<{ children: ReactNode; params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const header = await forPage((ctx) => journalHeader(ctx, { journalId }));
  return (
    <JournalShell journalId={journalId} isOwner={header.role === "person"}>
      {header.role === "person" ? null : (
        <p className="mb-4 text-note text-soft">
          {header.ownerName}’s notebook · you are here as {header.role === "family" ? "family helper" : header.role}
        </p>
      )}
      {children}
    </JournalShell>
  );
}
