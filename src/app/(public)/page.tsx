import Link from "next/link";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { Section } from "@/components/page";
import calibration from "@/domain/comparison/calibration-last-run.json";
import { highestFalseBetter } from "@/domain/comparison/calibration-figures";
import { env } from "@/env";
import { DemoButtons } from "@/features/account/components/demo-buttons";
import { FrontRule } from "@/features/account/components/front-rule";
import { requestContext } from "@/lib/request-context";

export default async function FrontPage() {
  const { actor } = await requestContext();
  const isSignedIn = actor.type === "user";
  const oneIn = Math.floor(1 / highestFalseBetter(calibration));
  return (
    <div className="max-w-[74rem] desk:grid desk:grid-cols-[minmax(0,1fr)_15.5rem] desk:gap-x-11">
      <div className="min-w-0">
        <div className="desk:grid desk:grid-cols-[minmax(0,1.3fr)_minmax(0,1fr)] desk:gap-x-10">
          <div>
            <h1 className="text-front">Change one thing. Write it down. See what followed.</h1>
            <p className="mt-4 text-lead">
              Notchbook is the journal for the first months on a new closed-loop insulin setup. It works out a careful start with its
              sources, keeps every version of your settings, and tells you what followed each change, or honestly that it can’t be told yet.
            </p>
            <p className="mt-3">A mentor asks the questions. An educator signs the numbers. You decide what they see.</p>
            <ButtonRow>
              <ButtonLink kind="next" href={isSignedIn ? "/journals/new" : "/sign-up"}>Start a journal</ButtonLink>
              {isSignedIn ? <ButtonLink href="/journals">Your journals</ButtonLink> : <ButtonLink href="/sign-in">Sign in</ButtonLink>}
            </ButtonRow>
          </div>
          <div className="mt-8 desk:mt-2"><FrontRule /></div>
        </div>
        {env.isDemo ? (
          <Section title="Look around with invented data">
            <DemoButtons />
            <p className="mt-1 text-note text-soft">One press signs you in. Everybody and everything in it is invented.</p>
          </Section>
        ) : null}
        <Section title="What it will not do">
          <p className="max-w-text">It gives no doses, sends nothing to any device, and keeps no score. Settings are for you and the people who treat you.</p>
        </Section>
        <Section title="Why believe a comparison?">
          <p className="max-w-text">
            Looked at every day from day {calibration.looks.first} to day {calibration.looks.last}, a change that did nothing is called better in fewer than one in {oneIn} cases, on{" "}
            {calibration.people} simulated people. <Link className="link" href="/how-it-compares">The page that shows it</Link> says what that covers and what it does not.
          </p>
        </Section>
      </div>
      <aside aria-label="Notes in the margin" className="mt-10 desk:mt-0"><Caution /></aside>
    </div>
  );
}
