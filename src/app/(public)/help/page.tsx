import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { Page, Section } from "@/components/page";

export const metadata: Metadata = { title: "Help" };

const GLOSSARY = [
  ["Basal rate", "insulin that runs in the background, in units an hour (U/h)"],
  ["Carb ratio", "grams of carbohydrate that one unit covers (g/U); a larger number means less insulin"],
  ["Sensitivity factor", "how far one unit brings glucose down; a larger number means less insulin"],
  ["Glucose target", "where corrections aim"],
  ["Duration of insulin action", "how long a dose keeps working, as a device counts it"],
  ["Insulin on board", "the part of earlier doses that is still working"],
  ["Total daily dose", "all insulin of a day: basal, meals and corrections"],
  ["Bolus, correction", "insulin for a meal; insulin to bring glucose back to the target"],
  ["Closed loop", "a pump, a sensor and a controller that adjusts insulin by itself"],
  ["Time in range", "share of readings from 70 to 180 mg/dL (3.9 to 10.0 mmol/L)"],
  ["Time below, time above", "share of readings under 70 mg/dL (3.9 mmol/L); share over 180 mg/dL (10.0 mmol/L)"],
  ["mg/dL and mmol/L", "two units for the same glucose; 18 mg/dL is about 1 mmol/L"],
  ["Version", "one set of settings, numbered, never rewritten"],
  ["Change", "what differs between two versions"],
  ["Expectation", "what you hope to see, said before the data"],
  ["Clean day", "a day with enough readings and nothing that spoils it, such as a fever"],
  ["Likely range", "a range that holds the true difference in about nine of ten cases like this; a wide one means that the days can’t tell much yet"],
  ["Can’t be told yet", "the difference so far is smaller than your own ups and downs from day to day"],
  ["Circle", "the people you let in: mentor, educator, family helper"],
  ["Fallback card", "the way back to the setup before, and whom to call"],
] as const;

export default function HelpPage() {
  return (
    <Page title="Help, and the words." lead={<p>Stuck with a setting or a low? This page can’t help with that: your written plan, your team, and in an emergency your local number can.</p>} margin={<Caution />}>
      <Section title="The first steps">
        <ol className="max-w-text list-decimal pl-6">
          <li>Start a journal and go through the pages of the starting profile. Everything is saved as you go.</li>
          <li>Invite your educator from the Circle page, then press “Ask the educator”.</li>
          <li>Bring in a file of glucose readings on the Data page.</li>
          <li>When the profile is approved, enter it on the device and say so on the version’s page. That is day 1.</li>
          <li>Log what happens on Today. Change one thing, wait three full days, then look at Compare.</li>
        </ol>
      </Section>
      <Section title="Words">
        <dl className="max-w-text">
          {GLOSSARY.map(([word, meaning]) => (
            <div key={word} className="border-b border-hairline py-2"><dt className="font-semibold">{word}</dt><dd>{meaning}</dd></div>
          ))}
        </dl>
      </Section>
    </Page>
  );
}
