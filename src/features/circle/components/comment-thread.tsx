import Link from "next/link";
import type { CommentSubject } from "@/domain/access/comment-subject";
import { forPage } from "@/lib/action";
import { listComments, type Comment } from "../queries/comments";
import { CommentForm } from "./comment-form";
import { CommentItem } from "./comment-item";

type Place = Readonly<{ journalId: string; subject: CommentSubject; subjectKey: string }>;

/** What was said about one version, day or comparison, and the form to say more. Any page of a journal may hold one. */
export async function CommentThread({ journalId, subject, subjectKey }: Place) {
  const place = { journalId, subject, subjectKey };
  const comments = await forPage((ctx) => listComments(ctx, place));
  const ids = new Set(comments.map(({ id }) => id));
  const tops = comments.filter(({ inReplyTo }) => inReplyTo === null || !ids.has(inReplyTo));
  return (
    <section id="comments" aria-labelledby="comments-heading" className="no-print mt-10 max-w-text scroll-mt-6">
      <h2 id="comments-heading" className="text-section">Comments and questions</h2>
      {tops.length === 0 ? (
        <p className="mt-1 text-soft">Nothing yet. A question often helps more than an answer: what was different that day?</p>
      ) : (
        <ul className="mt-3">
          {tops.map((comment) => (
            <li key={comment.id} className="border-t border-hairline py-3.5">
              <CommentItem comment={comment} />
              <Answers place={place} comment={comment} answers={answersTo(comments, comment.id)} />
            </li>
          ))}
        </ul>
      )}
      <CommentForm key={comments.length} {...place} />
      <p className="mt-4 text-note">
        <Link className="link" href={`/j/${journalId}/circle/comments`}>All comments of this notebook</Link>
      </p>
    </section>
  );
}

/** Everything said in answer to one comment, and in answer to that, in order of time. */
function answersTo(comments: ReadonlyArray<Comment>, id: string): Comment[] {
  const family = new Set([id]);
  return comments.filter((comment) => {
    const isIn = comment.inReplyTo !== null && family.has(comment.inReplyTo);
    if (isIn) family.add(comment.id);
    return isIn;
  });
}

function Answers({
  place, comment, answers,
}: Readonly<{ place: Place; comment: Comment; answers: ReadonlyArray<Comment> }>) {
  return (
    <div className="mt-2 border-l-2 border-hairline pl-4">
      {answers.map((answer) => (
        <div key={answer.id} className="py-2">
          <CommentItem comment={answer} />
        </div>
      ))}
      <details>
        <summary className="inline-flex min-h-target items-center text-note">
          <span className="link">Answer</span>
        </summary>
        <CommentForm key={answers.length} {...place} inReplyTo={comment.id} />
      </details>
    </div>
  );
}
