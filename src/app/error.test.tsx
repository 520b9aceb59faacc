import { render, screen } from "@testing-library/react";
import { userEvent } from "@testing-library/user-event";
import { expect, it, vi } from "vitest";
import ErrorPage from "./error";

it("shows the reference and nothing of the cause, and loads the page again", async () => {
  const retry = vi.fn();
  const error = Object.assign(new Error("glucose 300 of ada@example.org"), { digest: "0b7f-reference" });
  const { container } = render(<ErrorPage error={error} retry={retry} />);
  expect(screen.getByText("0b7f-reference")).toBeVisible();
  expect(container).not.toHaveTextContent(/ada@example|300/);
  await userEvent.click(screen.getByRole("button", { name: "Load it again" }));
  expect(retry).toHaveBeenCalledOnce();
});

it("stands without a reference too", () => {
  const { container } = render(<ErrorPage error="a text that was thrown" retry={() => undefined} />);
  expect(container).not.toHaveTextContent(/report this number|a text that was thrown/);
});
