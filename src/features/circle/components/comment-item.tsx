import { ROLE_WORDS } from "../constants";
import type { Comment } from "../queries/comments";

/** One comment: who, in which role, when, and the words as typed. Text is text: nothing in it is a link or a tag. */
export function CommentItem({ comment }: Readonly<{ comment: Comment }>) {
  const signs = [
    comment.kind === "question" ? (comment.isOpen ? "question, open" : "question") : "",
    comment.isUnread ? "new" : "",
  ].filter(Boolean);
  return (
    <>
      <p className="text-note text-soft">
        <span className="font-semibold text-ink">{comment.isOwn ? "You" : comment.authorName}</span>
        {comment.authorRole && !comment.isOwn ? `, ${ROLE_WORDS[comment.authorRole]}` : ""}
        {" · "}
        <time dateTime={comment.createdAt.toISOString()}>{comment.when}</time>
        {signs.map((sign) => <span key={sign} className="font-semibold text-ink"> · {sign}</span>)}
      </p>
      <p dir="auto" className="mt-1 whitespace-pre-line break-words">{comment.body}</p>
    </>
  );
}
