import { QueryClientProvider } from "@tanstack/react-query";
import { render } from "@testing-library/react";
import type { ReactNode } from "react";
import { MemoryRouter, Route, Routes } from "react-router-dom";
import { LiveRegion } from "../../../client/app/LiveRegion";
import { createQueryClient } from "../../../client/lib/queryClient";

/** A page at its address, as the application shows it, with the places that its links lead to named. */
export function renderPage(page: ReactNode, at: string, path = at) {
  const queryClient = createQueryClient();
  queryClient.setDefaultOptions({ queries: { ...queryClient.getDefaultOptions().queries, retry: false } });
  const view = render(
    <QueryClientProvider client={queryClient}>
      <MemoryRouter initialEntries={[at]}>
        <Routes>
          <Route path={path.split("?")[0] ?? path} element={page} />
          <Route path="*" element={<p>another page</p>} />
        </Routes>
      </MemoryRouter>
      <LiveRegion />
    </QueryClientProvider>,
  );
  return { ...view, queryClient };
}
