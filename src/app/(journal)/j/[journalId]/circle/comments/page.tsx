import type { Metadata } from "next";
import { Page, Section } from "@/components/page";
import { can } from "@/domain/access/policy";
import { leaveCircleAction } from "@/features/circle/actions";
import { LatestComments } from "@/features/circle/components/latest-comments";
import { PressForm } from "@/features/circle/components/press-form";
import { latestComments } from "@/features/circle/queries/comments";
import { forPage } from "@/lib/action";
import { requestContext } from "@/lib/request-context";

export const metadata: Metadata = { title: "Comments and questions" };

export default async function CommentsPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const comments = await forPage((ctx) => latestComments(ctx, { journalId }));
  const mayLeave = can((await requestContext()).actor, "circle.leave", journalId);
  const unread = comments.filter(({ isUnread }) => isUnread).length;
  const open = comments.filter(({ isOpen }) => isOpen).length;
  const title = unread > 0 ? `${unread} new ${unread === 1 ? "comment" : "comments"}.` : open > 0 ? `${open} open ${open === 1 ? "question" : "questions"}.` : "Comments and questions.";
  return (
    <Page title={title}>
      <LatestComments journalId={journalId} comments={comments} />
      {mayLeave ? (
        <Section title="Leave this notebook" id="leave">
          <p className="max-w-text">You see nothing of it from then on, and no mail comes. What you wrote stays. The person can ask you again.</p>
          <PressForm action={leaveCircleAction} label="Leave" hidden={{ journalId }} kind="other" />
        </Section>
      ) : null}
    </Page>
  );
}
