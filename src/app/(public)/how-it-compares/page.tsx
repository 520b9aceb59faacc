import type { Metadata } from "next";
import { Caution } from "@/components/caution";
import { Page, Section } from "@/components/page";
import calibration from "@/domain/comparison/calibration-last-run.json";

export const metadata: Metadata = { title: "How it compares" };

const shown = (share: number | null) => (share === null ? "–" : `${(100 * share).toFixed(1)}%`);

export default function HowItComparesPage() {
  return (
    <Page
      title="How often the comparison misleads, tried out."
      lead={<p>The rules were run on {calibration.people} simulated people whose truth is known, looked at every day from day {calibration.looks.first} to day {calibration.looks.last} after a change. Last run {calibration.date}, seed {calibration.seed}; anyone can run it again.</p>}
      margin={<Caution />}
    >
      <Section title="The figures of the last run">
        <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Table of the last run">
          <table className="table">
            <thead>
              <tr><th scope="col">What was changed</th><th scope="col">Looked at</th><th scope="col">Insulin log</th><th scope="col" className="number">Changes</th><th scope="col" className="number">Called better</th><th scope="col" className="number">Called worse</th><th scope="col" className="number">Lower at equal insulin</th><th scope="col" className="number">Truth inside the likely range</th></tr>
            </thead>
            <tbody>
              {calibration.cells.map((cell) => (
                <tr key={`${cell.condition}-${cell.outcome}-${String(cell.isInsulinLogged)}`}>
                  <th scope="row" className="font-normal">{cell.condition}</th>
                  <td>{cell.outcome.replaceAll("-", " ")}</td>
                  <td>{cell.isInsulinLogged ? "yes" : "no"}</td>
                  <td className="number">{cell.counts.changes}</td>
                  <td className="number">{shown(cell.rates.better)}</td>
                  <td className="number">{shown(cell.rates.worse)}</td>
                  <td className="number">{shown(cell.rates.lowerAtEqualInsulin)}</td>
                  <td className="number">{shown(cell.rates.covered)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </Section>
      <Section title="What this does not cover">
        <ul className="max-w-text list-disc pl-6">
          <li>Real people and real changes: none were used.</li>
          <li>Habits that change together with a setting, seasons, sensors, a cycle: a before and after can’t part them.</li>
          <li>Days that are much more alike than assumed: then it calls too easily.</li>
          <li>Small single changes: most of them can’t be told within two weeks, and that is what it says.</li>
        </ul>
      </Section>
    </Page>
  );
}
