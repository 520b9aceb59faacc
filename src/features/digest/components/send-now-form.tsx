"use client";

import { useState } from "react";
import { z } from "zod";
import { ActionForm } from "@/components/form/action-form";
import { Notice } from "@/components/notice";
import { sendDigestNowAction } from "../actions";

const nothingToType = z.looseObject({});

/** Send the week up to today, besides the weekly mail. */
export function SendNowForm() {
  const [isSent, setSent] = useState(false);
  return (
    <>
      <ActionForm schema={nothingToType} action={sendDigestNowAction} submitLabel="Send me one now" submitKind="other" onDone={() => setSent(true)} />
      {isSent ? <Notice>It is on its way; that can last a minute.</Notice> : null}
    </>
  );
}
