import { Link } from "@react-email/components";
import { EmailFrame, EmailText } from "@/components/email-frame";

/** Says that there is something to read and where; never what. */
export function NewCommentMail({
  authorName, ownerName, isByOwner, isOwn, isQuestion, href, accountHref,
}: Readonly<{ authorName: string; ownerName: string; isByOwner: boolean; isOwn: boolean; isQuestion: boolean; href: string; accountHref: string }>) {
  const notebook = isOwn ? "your notebook" : isByOwner ? "the notebook you help with" : `${ownerName}’s notebook`;
  return (
    <EmailFrame
      preview={`Something new to read in ${notebook}.`}
      heading={isQuestion ? "A question for you to read" : "Something new to read"}
      link={{ href, label: "Read it in the notebook" }}
      foot={
        <>
          You get this because you {isOwn ? "keep this notebook" : "are in the circle of this notebook"}. Until you have marked its comments as
          read, at most one such mail comes a day.
          <br />
          <Link style={{ color: "inherit", textDecoration: "underline" }} href={accountHref}>Choose what is told to you by mail</Link>
        </>
      }
    >
      <EmailText>{authorName} {isQuestion ? "asks something" : "wrote something"} in {notebook}. The words stay there; this mail only says so.</EmailText>
    </EmailFrame>
  );
}
