import type { Metadata } from "next";
import { ButtonLink, ButtonRow } from "@/components/button";
import { StopPage } from "@/components/stop-page";

export const metadata: Metadata = { title: "Signed out" };

export default function Unauthorized() {
  return (
    <StopPage title="You are signed out." lead={<p>Sign in, and this page opens again.</p>}>
      <ButtonRow><ButtonLink kind="next" href="/sign-in">Sign in</ButtonLink></ButtonRow>
    </StopPage>
  );
}
