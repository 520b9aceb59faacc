import type { Metadata } from "next";
import { Page } from "@/components/page";
import { LatestComments } from "@/features/circle/components/latest-comments";
import { latestComments } from "@/features/circle/queries/comments";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Comments and questions" };

export default async function CommentsPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const comments = await forPage((ctx) => latestComments(ctx, { journalId }));
  const unread = comments.filter(({ isUnread }) => isUnread).length;
  const open = comments.filter(({ isOpen }) => isOpen).length;
  const title = unread > 0 ? `${unread} new ${unread === 1 ? "comment" : "comments"}.` : open > 0 ? `${open} open ${open === 1 ? "question" : "questions"}.` : "Comments and questions.";
  return (
    <Page title={title}>
      <LatestComments journalId={journalId} comments={comments} />
    </Page>
  );
}
