import type { Metadata } from "next";
import Link from "next/link";
import { Empty } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { HelperList, InvitationList } from "@/features/circle/components/helper-list";
import { InviteForm } from "@/features/circle/components/invite-form";
import { circle } from "@/features/circle/queries/circle";
import { unreadComments } from "@/features/circle/queries/unread-comments";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Circle" };

const COUNTS = ["Nobody helps", "One person helps", "Two people help", "Three people help", "Four people help"];

export default async function CirclePage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { helpers, invitations } = await forPage((ctx) => circle(ctx, { journalId }));
  const unread = (await forPage((ctx) => unreadComments(ctx))).get(journalId) ?? 0;
  const base = `/j/${journalId}/circle`;
  return (
    <Page
      title={`${COUNTS[helpers.length] ?? `${helpers.length} people help`} in this notebook.`}
      lead={
        <ul className="flex flex-wrap gap-x-6">
          <li><Link className="link inline-flex min-h-target items-center" href={`${base}/comments`}>Comments and questions{unread > 0 ? `, ${unread} new` : ""}</Link></li>
          <li><Link className="link inline-flex min-h-target items-center" href={`${base}/access-log`}>Who looked at what, when</Link></li>
        </ul>
      }
      margin={
        <>
          <MarginNote title="What each role may do">
            <p>A mentor reads, comments and asks, and never sets a number. An educator reviews and signs. A family helper reads and logs. Nobody but you puts a setting into effect or changes who sees what.</p>
          </MarginNote>
          <MarginNote title="When a change counts">
            <p>From the next page they open. Mail that has not left yet stays here.</p>
          </MarginNote>
        </>
      }
    >
      <Section title="Who helps" id="helpers">
        {helpers.length > 0 ? (
          <HelperList journalId={journalId} helpers={helpers} />
        ) : (
          <Empty title="Nobody yet.">
            <p>An educator can review your settings, and somebody who has been through it can ask the question you have not thought of. Ask one of them below.</p>
          </Empty>
        )}
      </Section>
      {invitations.length > 0 ? (
        <Section title="Asked, not here yet" id="invitations">
          <InvitationList journalId={journalId} invitations={invitations} />
        </Section>
      ) : null}
      <Section title="Ask somebody" id="invite">
        <InviteForm key={`${invitations.length}-${helpers.length}`} journalId={journalId} />
      </Section>
    </Page>
  );
}
