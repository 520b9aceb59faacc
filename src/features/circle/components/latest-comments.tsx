import Link from "next/link";
import { Empty } from "@/components/notice";
import { subjectPath, subjectText } from "@/domain/access/comment-place";
import { markCommentsReadAction } from "../actions";
import type { Comment } from "../queries/comments";
import { CommentItem } from "./comment-item";
import { PressForm } from "./press-form";

/** The comments of a whole journal, newest first, each with the way to what it is about. */
export function LatestComments({ journalId, comments }: Readonly<{ journalId: string; comments: ReadonlyArray<Comment> }>) {
  const [newest] = comments;
  if (!newest) {
    return (
      <Empty title="Nothing has been said yet.">
        <p>Comments and questions stand under each version, day and comparison. Open one of them to write the first.</p>
      </Empty>
    );
  }
  return (
    <>
      {comments.some(({ isUnread }) => isUnread) ? (
        <PressForm action={markCommentsReadAction} label="Mark all as read" hidden={{ journalId, readUpTo: newest.createdAt.toISOString() }} />
      ) : null}
      <ul className="mt-6 max-w-text">
        {comments.map((comment) => (
          <li key={comment.id} className="border-t border-hairline py-3.5">
            <CommentItem comment={comment} />
            <p className="mt-1 text-note">
              <Link className="link" href={subjectPath(journalId, comment.subject, comment.subjectKey)}>
                On {subjectText(comment.subject, comment.subjectKey)}
              </Link>
            </p>
          </li>
        ))}
      </ul>
    </>
  );
}
