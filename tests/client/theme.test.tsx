import { readFileSync } from "node:fs";
import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { describe, expect, it } from "vitest";
import { ThemeSwitch } from "../../client/app/ThemeSwitch";
import { themeKey } from "../../client/app/theme";

const root = document.documentElement;

describe("the theme", () => {
  it("follows the system until it is set, keeps what is set, and follows again", async () => {
    render(<ThemeSwitch />);
    const board = screen.getByLabelText("Board");
    expect(board).toHaveDisplayValue("as the system");
    expect(root).not.toHaveAttribute("data-theme");

    await userEvent.selectOptions(board, "dark");
    expect(root).toHaveAttribute("data-theme", "dark");
    expect(localStorage.getItem(themeKey)).toBe("dark");

    await userEvent.selectOptions(board, "as the system");
    expect(root).not.toHaveAttribute("data-theme");
    expect(localStorage.getItem(themeKey)).toBeNull();
  });

  it("is there before the first paint, from the script that runs first", () => {
    localStorage.setItem(themeKey, "light");
    new Function(readFileSync("client/public/theme.js", "utf8"))();
    expect(root).toHaveAttribute("data-theme", "light");
  });
});
