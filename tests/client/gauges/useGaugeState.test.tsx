import { act, fireEvent, render, screen } from "@testing-library/react";
import { createMemoryRouter, MemoryRouter, RouterProvider, useLocation } from "react-router-dom";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { useGaugeState } from "../../../client/features/gauges/useGaugeState";

const codec = {
  read: (params: URLSearchParams) => Number(params.get("size") ?? "10"),
  write: (size: number) => new URLSearchParams({ size: String(size) }),
};

function Gauge() {
  const [size, setSize] = useGaugeState(codec);
  const { search } = useLocation();
  return (
    <>
      <button type="button" onClick={() => setSize((now) => now + 1)}>
        {size}
      </button>
      <output>{search}</output>
    </>
  );
}

describe("useGaugeState", () => {
  beforeEach(() => {
    vi.useFakeTimers();
  });
  afterEach(() => {
    vi.useRealTimers();
  });
  const settle = () => act(() => vi.advanceTimersByTime(300));

  it("reads the address, and leaves it alone until something changes", () => {
    render(
      <MemoryRouter initialEntries={["/gauge?size=42"]}>
        <Gauge />
      </MemoryRouter>,
    );
    settle();
    expect(screen.getByRole("button")).toHaveTextContent("42");
    expect(screen.getByRole("status")).toHaveTextContent("?size=42");
  });

  it("shows a change at once and writes it when it has been still", () => {
    render(
      <MemoryRouter initialEntries={["/gauge"]}>
        <Gauge />
      </MemoryRouter>,
    );
    fireEvent.click(screen.getByRole("button"));
    fireEvent.click(screen.getByRole("button"));
    expect(screen.getByRole("button")).toHaveTextContent("12");
    expect(screen.getByRole("status")).toBeEmptyDOMElement();
    settle();
    expect(screen.getByRole("status")).toHaveTextContent("?size=12");
  });

  it("makes no steps for the back button, and reads an address that changes from outside", async () => {
    const router = createMemoryRouter(
      [
        { path: "/gauge", element: <Gauge /> },
        { path: "/", element: <p>Before</p> },
      ],
      { initialEntries: ["/", "/gauge"], initialIndex: 1 },
    );
    render(<RouterProvider router={router} />);
    fireEvent.click(screen.getByRole("button"));
    settle();
    await act(() => router.navigate("/gauge?size=77"));
    expect(screen.getByRole("button")).toHaveTextContent("77");
    await act(() => router.navigate(-1));
    expect(screen.getByRole("button")).toHaveTextContent("11");
    await act(() => router.navigate(-1));
    expect(screen.getByText("Before")).toBeInTheDocument();
  });
});
