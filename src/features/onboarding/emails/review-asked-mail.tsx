import { EmailFrame, EmailText } from "@/components/email-frame";

export function ReviewAskedMail({ href }: Readonly<{ href: string }>) {
  return (
    <EmailFrame
      preview="Somebody in your circle asks for a review."
      heading="A proposal waits for you"
      link={{ href, label: "Open the queue" }}
      foot="You get this because you are an educator in this person’s circle. It holds no settings and no glucose values on purpose."
    >
      <EmailText>A person you support has written down a profile and asks you to look it over.</EmailText>
    </EmailFrame>
  );
}
