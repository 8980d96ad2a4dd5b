import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { MemoryRouter, Route, Routes } from "react-router-dom";
import { afterEach, beforeEach, expect, it, type Mock, vi } from "vitest";
import { SignInPage } from "../../../client/features/account/SignInPage";
import { forgetToken } from "../../../client/lib/api";

const json = (body: unknown, status = 200) =>
  new Response(JSON.stringify(body), {
    status,
    headers: { "content-type": status < 400 ? "application/json" : "application/problem+json" },
  });
const demoAccounts = [{ email: "ada@example.org", password: "a demo password", who: "a restorer" }];
const signedOut = { user: null, csrfToken: "token", demoAccounts };
const user = { id: "1", email: "ada@example.org", displayName: "Ada", role: "restorer", emailVerified: true };
let signIn: Mock<(init?: RequestInit) => Response>;

beforeEach(() => {
  signIn = vi.fn(() => json({ user, csrfToken: "another" }));
  vi.stubGlobal("fetch", (path: string, init?: RequestInit) =>
    Promise.resolve(path.endsWith("/auth/sign-in") ? signIn(init) : json(signedOut)),
  );
});
afterEach(() => {
  vi.unstubAllGlobals();
  forgetToken();
});

function open(at = "/sign-in") {
  render(
    <QueryClientProvider client={new QueryClient({ defaultOptions: { queries: { retry: false } } })}>
      <MemoryRouter initialEntries={[at]}>
        <Routes>
          <Route path="/sign-in" element={<SignInPage />} />
          <Route path="*" element={<p>elsewhere</p>} />
        </Routes>
      </MemoryRouter>
    </QueryClientProvider>,
  );
  return userEvent.setup();
}
const submit = () => screen.getByRole("button", { name: "Sign in" });

it("says what is missing beside each field and in a summary that takes the focus, and asks nobody", async () => {
  const someone = open();
  await someone.click(submit());
  const summary = await screen.findByRole("alert");
  expect(summary).toHaveTextContent("There is a problem");
  expect(summary).toHaveFocus();
  expect(screen.getByLabelText("E-mail address")).toHaveAccessibleDescription("Give your e-mail address");
  expect(signIn).not.toHaveBeenCalled();
});

it("keeps what was typed where the server refuses, in the server's words", async () => {
  signIn.mockReturnValue(
    json({ type: "/problems/wrong-credentials", title: "", status: 401, detail: "Not right." }, 401),
  );
  const someone = open();
  await someone.type(screen.getByLabelText("E-mail address"), "ada@example.org");
  await someone.type(screen.getByLabelText("Password"), "wrong");
  await someone.click(submit());
  expect(await screen.findByRole("alert")).toHaveTextContent("Not right.");
  expect(screen.getByLabelText("E-mail address")).toHaveValue("ada@example.org");
  expect(screen.getByLabelText("Password")).toHaveValue("wrong");
});

it("fills in an account to try, sends it once with the token, and goes on", async () => {
  const someone = open("/sign-in?next=%2Fbasket");
  await someone.click(await screen.findByRole("button", { name: "Fill in a restorer" }));
  await someone.dblClick(submit());
  expect(await screen.findByText("elsewhere")).toBeVisible();
  expect(signIn).toHaveBeenCalledTimes(1);
  const sent = signIn.mock.calls[0]?.[0] as RequestInit;
  expect(JSON.parse(String(sent.body))).toEqual({ email: "ada@example.org", password: "a demo password" });
  expect(new Headers(sent.headers).get("x-csrf-token")).toBe("token");
});

it("shows a password only when asked", async () => {
  const someone = open();
  expect(screen.getByLabelText("Password")).toHaveAttribute("type", "password");
  await someone.click(screen.getByRole("button", { name: "Show the password" }));
  expect(screen.getByLabelText("Password")).toHaveAttribute("type", "text");
});
