import { PressButton } from "@/components/form/press-button";
import { demoSignInAction } from "../actions";
import { DEMO_ROLE_WORDS } from "../constants";

/** One press signs in as an invented person of each role. */
export function DemoButtons() {
  return (
    <ul className="flex flex-wrap gap-x-5">
      {Object.entries(DEMO_ROLE_WORDS).map(([role, words]) => (
        <li key={role}><PressButton action={demoSignInAction} label={words} hidden={{ role }} look="link" /></li>
      ))}
    </ul>
  );
}
