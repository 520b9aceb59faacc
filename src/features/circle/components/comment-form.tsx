"use client";

import { Button } from "@/components/button";
import { ActionForm } from "@/components/form/action-form";
import { TextArea } from "@/components/form/fields";
import type { CommentSubject } from "@/domain/access/comment-subject";
import { addCommentAction } from "../actions";
import { commentFormInput } from "../schema";

/** Write a comment or a question; with `inReplyTo` an answer. */
export function CommentForm({
  journalId, subject, subjectKey, inReplyTo,
}: Readonly<{ journalId: string; subject: CommentSubject; subjectKey: string; inReplyTo?: string }>) {
  const place = { journalId, subject, subjectKey };
  const askInstead = <Button kind="other" name="kind" value="question">Send as a question</Button>;
  return (
    <ActionForm
      schema={commentFormInput}
      action={addCommentAction}
      submitLabel={inReplyTo ? "Send the answer" : "Send as a comment"}
      hidden={inReplyTo ? { ...place, inReplyTo } : place}
      idPrefix={`comment-${inReplyTo ?? subjectKey}`}
      extraButtons={askInstead}
    >
      <TextArea name="body" label={inReplyTo ? "Your answer" : "Comment or question"} rows={3} />
    </ActionForm>
  );
}
