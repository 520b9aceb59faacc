import type { ValueBlock } from "@/domain/onboarding/block-facts";
import type { SettingFamily } from "@/domain/settings/family";

type BlockField = Readonly<{ name: string; label: string }>;

/** What an editor of one setting needs to know beside the rows. */
export type BlockPage = Readonly<{
  title: string;
  unit: string;
  family: SettingFamily;
  fields: ReadonlyArray<BlockField>;
  /** The pump's own blocks of now; null from injections. */
  previous: ReadonlyArray<ValueBlock> | null;
  /** The cautious start, by the first field; null where no number may be shown. */
  cautious: ReadonlyArray<ValueBlock> | null;
  spread: Readonly<{ low: number; high: number }> | null;
  /** The device's smallest step; null where it has none that matters. */
  deviceStep: number | null;
  /** What an arrow key moves a value by. */
  nudge: number;
  isTotalShown: boolean;
}>;
