import { AppError } from "@/domain/errors";
import { unsubscribe } from "@/features/digest/use-cases/unsubscribe";
import { apiRoute, json } from "@/lib/api";

/**
 * The address in the List-Unsubscribe header. A mail program posts here on one
 * press, from its own servers, without a cookie (RFC 8058): the link is the
 * proof, and where the request comes from is not asked.
 */
export const POST = apiRoute(async (ctx, request, { token = "" }) => {
  if (!(await isOneClick(request))) throw new AppError("INVALID_INPUT", "not a one-click request", { body: ["Send List-Unsubscribe=One-Click."] });
  await unsubscribe(ctx, { token });
  return json({ unsubscribed: true });
}, { isLinkEnough: true });

/** A person who opens it gets the page with the button; opening changes nothing. */
export const GET = apiRoute((_ctx, _request, { token = "" }) => {
  const headers = { Location: `/unsubscribe?token=${encodeURIComponent(token)}` };
  return Promise.resolve(new Response(null, { status: 303, headers }));
}, { isLinkEnough: true });

async function isOneClick(request: Request): Promise<boolean> {
  try {
    return (await request.formData()).get("List-Unsubscribe") === "One-Click";
  } catch {
    return false;
  }
}
