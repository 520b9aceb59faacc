import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { Page, Section } from "@/components/page";

export const metadata: Metadata = { title: "What it is" };

const PEOPLE = [
  ["Person", "owns the journal: writes, proposes, decides what comes into effect, invites and removes helpers", "never signs the own proposal as an educator"],
  ["Mentor", "has been through it: reads what is shared, comments, asks", "never writes, proposes or approves a number"],
  ["Educator", "licensed and verified: reviews, approves, sends back, declines", "never puts a version into effect in the person’s place"],
  ["Family helper", "logs and watches for the person, as far as allowed", "never changes sharing, proposes or approves"],
  ["Administrator", "verifies licences, keeps the service running", "never reads health data"],
] as const;

export default function AboutPage() {
  return (
    <Page
      title="The journal of small changes."
      lead={<p>For a person who starts a new closed-loop insulin setup, and for the people who help. Before day 1 it works out a start that is weaker than the arithmetic on purpose, and writes down the way back. From day 1 it keeps what was eaten, dosed, changed and felt, one change at a time, and says what followed.</p>}
      margin={<Caution />}
    >
      <Section title="Who may do what">
        <dl className="max-w-text">
          {PEOPLE.map(([who, may, never]) => (
            <div key={who} className="border-b border-hairline py-3 desk:grid desk:grid-cols-[9rem_minmax(0,1fr)] desk:gap-x-6">
              <dt className="font-semibold">{who}</dt>
              <dd>{may} <span className="block text-soft">{never}</span></dd>
            </div>
          ))}
        </dl>
      </Section>
      <Section title="What it will not do">
        <p className="max-w-text">No doses, no forecasts, nothing sent to a device, no score. Every number shows where it comes from. Where the days can’t tell, it says so.</p>
      </Section>
    </Page>
  );
}
