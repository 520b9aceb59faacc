import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { findVersion } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import { applyEdit, type SettingEdit } from "@/domain/settings/apply-change";
import type { Context } from "@/lib/context";
import { changeSettingInput, type ChangeSettingInput } from "../schema";
import { saveVersion } from "./save-version";

/**
 * The change form: one setting, one part of the day, old to new.
 *
 * @throws {AppError} as `saveVersion`; INVALID_INPUT on `value` when nothing would differ
 */
export async function changeSetting(ctx: Context, input: ChangeSettingInput): Promise<{ number: number; state: VersionState }> {
  const form = changeSettingInput.parse(input);
  const { journalId, baseVersion, action } = form;
  authorize(ctx.actor, action === "propose" ? "version.propose" : "version.record", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const base = await findVersion(ctx.db, journalId, baseVersion);
  if (!journal || !base) throw new AppError("NOT_FOUND", `version ${baseVersion}`);
  return saveVersion(ctx, {
    journalId,
    baseVersion,
    profile: edited(base.profile, editOf(form), journal.glucoseUnit),
    reason: { code: form.reason, text: form.reasonText },
    expectation: { outcome: form.expectedOutcome, window: form.expectedWindow, direction: form.expectedDirection },
    evidenceDays: form.evidenceDays,
    lookAgainOn: form.lookAgainOn,
    revertRule: form.revertRule,
    answers: form.answers,
    action,
  });
}

function editOf(form: ReturnType<typeof changeSettingInput.parse>): SettingEdit {
  const part = { fromMinute: form.from, toMinute: form.to };
  if (form.setting === "target") return { ...part, family: "target", low: form.targetLow ?? 0, high: form.targetHigh ?? 0 };
  return { ...part, family: form.setting, value: form.value ?? 0 };
}

function edited(...given: Parameters<typeof applyEdit>): ReturnType<typeof applyEdit> {
  try {
    return applyEdit(...given);
  } catch (error) {
    if (error instanceof AppError && error.code === "CONFLICT") {
      throw new AppError("INVALID_INPUT", error.message, { value: ["This is the value that is in effect already."] });
    }
    throw error;
  }
}
