import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { Page } from "@/components/page";
import { NewJournalForm } from "@/features/onboarding/components/new-journal-form";
import { newJournalStart } from "@/features/onboarding/queries/new-journal";
import { forPage } from "@/lib/action";
import { zoneNames } from "@/domain/zone-name";

export const metadata: Metadata = { title: "Start a journal" };

export default async function NewJournalPage() {
  const start = await forPage(newJournalStart);
  return (
    <Page title="Start a journal." lead={<p>A few words about the setup, then the starting profile, a page at a time. Everything is saved as you go.</p>} margin={<Caution />}>
      <NewJournalForm zones={zoneNames()} {...start} />
    </Page>
  );
}
