import { render, screen, waitFor, within } from "@testing-library/react";
import { userEvent } from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { renderToString } from "react-dom/server";
import { z } from "zod";
import { ActionForm } from "./action-form";
import { ChoiceField, TickField } from "./choices";
import { TextField } from "./fields";
import type { FormState } from "./form-state";

const NAME_WORDS = "Type the name that others see.";
const ADDRESS_WORDS = "This address is in use.";
const schema = z.object({ name: z.string().min(1, NAME_WORDS), address: z.string().min(1, "Type an address."), secret: z.string().optional() });
const REFUSAL: FormState = { ok: false, code: "INVALID_INPUT", message: "There is a problem with what was typed.", fields: { address: [ADDRESS_WORDS] }, typed: { name: "Ada", address: "a@example.org" } };
const DONE: FormState = { ok: true, data: "as asked" };

function shown(action: (previous: FormState, form: FormData) => Promise<FormState>, more: Partial<Parameters<typeof ActionForm>[0]> = {}) {
  return (
    <ActionForm schema={schema} action={action} submitLabel="Save" {...more}>
      <TextField name="name" label="Name" hint="A first name is enough." />
      <TextField name="address" label="Address" />
    </ActionForm>
  );
}

const press = () => userEvent.click(screen.getByRole("button", { name: "Save" }));
const field = (label: string) => screen.getByLabelText<HTMLInputElement>(label);

describe("ActionForm", () => {
  beforeEach(() => {
    document.title = "A page";
  });
  afterEach(() => {
    document.body.replaceChildren();
  });

  it("asks its own schema first: the summary takes the focus and sends nothing", async () => {
    const action = vi.fn(() => Promise.resolve(DONE));
    render(shown(action));
    await userEvent.type(field("Address"), "a@example.org");
    await press();
    const summary = await screen.findByRole("alert");
    expect(summary).toHaveFocus();
    expect(document.title).toBe("Error: A page");
    expect(action).not.toHaveBeenCalled();
    expect(field("Address")).toHaveValue("a@example.org");
  });

  it("says the same words in the summary and beside the field, and ties them to it", async () => {
    render(shown(() => Promise.resolve(DONE)));
    await press();
    const link = within(await screen.findByRole("alert")).getByRole("link", { name: NAME_WORDS });
    const name = field("Name");
    expect(name).toHaveAccessibleDescription(`A first name is enough. Error: ${NAME_WORDS}`);
    expect(name).toBeInvalid();
    expect(link).toHaveAttribute("href", `#${name.id}`);
    await userEvent.click(link);
    expect(name).toHaveFocus();
  });

  it("keeps what was typed when the server refuses, and says its words twice", async () => {
    render(shown(() => Promise.resolve(REFUSAL)));
    await userEvent.type(field("Name"), "Ada");
    await userEvent.type(field("Address"), "a@example.org");
    await press();
    const summary = await screen.findByRole("alert");
    expect(within(summary).getByRole("link", { name: ADDRESS_WORDS })).toBeVisible();
    expect(summary).toHaveFocus();
    expect(field("Address")).toHaveAccessibleDescription(`Error: ${ADDRESS_WORDS}`);
    expect([field("Name").value, field("Address").value]).toEqual(["Ada", "a@example.org"]);
  });

  it("forgets the server's refusal once the browser finds something else amiss", async () => {
    render(shown(() => Promise.resolve(REFUSAL)));
    await userEvent.type(field("Name"), "Ada");
    await userEvent.type(field("Address"), "a@example.org");
    await press();
    await screen.findByRole("link", { name: ADDRESS_WORDS });
    await userEvent.clear(field("Name"));
    await press();
    await waitFor(() => expect(screen.getByRole("alert")).toHaveTextContent(NAME_WORDS));
    expect(screen.getByRole("alert")).not.toHaveTextContent(ADDRESS_WORDS);
  });

  it("links to no field that cannot be seen", async () => {
    const spent: FormState = { ...REFUSAL, fields: { token: ["This link was used already."] } };
    render(shown(() => Promise.resolve(spent), { hidden: { token: "abc" } }));
    await userEvent.type(field("Name"), "Ada");
    await userEvent.type(field("Address"), "a");
    await press();
    const summary = await screen.findByRole("alert");
    expect(summary).toHaveTextContent("This link was used already.");
    expect(within(summary).queryByRole("link")).toBeNull();
  });

  it("sends what the fields hold once, and says what was done", async () => {
    let finish = (_state: FormState) => undefined as void;
    const sent: Record<string, FormDataEntryValue>[] = [];
    const action = (_previous: FormState, form: FormData) => {
      sent.push(Object.fromEntries(form));
      return new Promise<FormState>((resolve) => {
        finish = resolve;
      });
    };
    render(shown(action, { hidden: { journalId: "j" }, done: (data) => <p>Saved {String(data)}.</p> }));
    await userEvent.type(field("Name"), "Ada");
    await userEvent.type(field("Address"), "a@example.org");
    await press();
    await userEvent.click(await screen.findByRole("button", { name: "Saving …" }));
    finish(DONE);
    await waitFor(() => expect(screen.getByRole("status")).toHaveTextContent("Saved as asked."));
    expect(sent).toEqual([{ journalId: "j", name: "Ada", address: "a@example.org" }]);
    expect(field("Name")).toHaveValue("Ada");
  });

  it("empties itself where it is told to, and only when the server has taken it", async () => {
    const answers = [REFUSAL, DONE];
    render(shown(() => Promise.resolve(answers.shift() ?? null), { isEmptiedWhenDone: true, start: { name: "Bo" } }));
    await userEvent.type(field("Address"), "x");
    await press();
    await screen.findByRole("alert");
    expect(field("Address")).toHaveValue("x");
    await press();
    await waitFor(() => expect(field("Address")).toHaveValue(""));
    expect(field("Name")).toHaveValue("Bo");
  });

  it("ties the words to choices and ticks too", async () => {
    const choices = z.object({ unit: z.enum(["a", "b"], "Choose a unit."), isRead: z.literal("on", "Say that you have read this.") });
    render(
      <ActionForm schema={choices} action={() => Promise.resolve(DONE)} submitLabel="Save">
        <ChoiceField name="unit" label="Unit" options={[{ value: "a", label: "A" }, { value: "b", label: "B" }]} />
        <TickField name="isRead" label="I have read this." />
      </ActionForm>,
    );
    await press();
    expect(await screen.findByRole("group", { name: "Unit" })).toHaveAccessibleDescription("Error: Choose a unit.");
    expect(screen.getByRole("checkbox")).toHaveAccessibleDescription("Error: Say that you have read this.");
    await userEvent.click(screen.getByRole("link", { name: "Choose a unit." }));
    expect(screen.getByRole("radio", { name: "A" })).toHaveFocus();
  });

  it("stands complete on the page before any script runs", () => {
    const html = renderToString(shown(() => Promise.resolve(DONE), { hidden: { token: "abc" }, start: { name: "Bo" } }));
    expect(html).toMatch(/<input[^>]*type="hidden"[^>]*name="token"[^>]*value="abc"|<input[^>]*type="hidden"[^>]*value="abc"[^>]*name="token"/);
    expect(html).toMatch(/<input[^>]*value="Bo"/);
    expect(html).toMatch(/<button[^>]*type="submit"/);
  });
});
