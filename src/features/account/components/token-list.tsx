import { PressButton } from "@/components/form/press-button";
import { dateTimeText } from "@/domain/day-text";
import { revokeTokenAction } from "../actions";

type Token = Readonly<{ id: string; label: string; scope: "read" | "write"; expiresAt: Date; lastUsedAt: Date | null }>;

/** The live tokens of an account, each with a press that ends it. */
export function TokenList({ tokens, timeZone }: Readonly<{ tokens: ReadonlyArray<Token>; timeZone: string }>) {
  if (tokens.length === 0) return <p className="text-soft">There is no token.</p>;
  return (
    <ul className="max-w-text">
      {tokens.map((token) => (
        <li key={token.id} className="flex flex-wrap items-center justify-between gap-3 border-b border-hairline py-2">
          <span className="min-w-0 break-words">
            {token.label} <span className="block text-note text-soft">
              {token.scope === "read" ? "reads" : "reads and writes"}, until {dateTimeText(token.expiresAt, timeZone)}, {token.lastUsedAt ? `last used ${dateTimeText(token.lastUsedAt, timeZone)}` : "not used yet"}
            </span>
          </span>
          <PressButton action={revokeTokenAction} label="End it" hidden={{ tokenId: token.id }} look="link" />
        </li>
      ))}
    </ul>
  );
}
