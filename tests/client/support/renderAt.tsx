import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { render } from "@testing-library/react";
import { Suspense } from "react";
import { MemoryRouter, Route, Routes, useLocation } from "react-router-dom";
import { LiveRegion } from "../../../client/app/LiveRegion";
import { fetchStripTools } from "../../../client/features/search/useStripTools";
import { forgetToken } from "../../../client/lib/api";

// The strip waits for it where sizes stand in the address, and a rendering under test does not.
await fetchStripTools();

/** Where the router stands, to be read by tests. */
function Where() {
  const { pathname, search } = useLocation();
  return <output aria-label="address">{`${pathname}${search}`}</output>;
}

/** Renders pages inside the providers at an address; queries are not tried twice. */
export function renderAt(address: string, pages: Record<string, React.ReactNode>, head?: React.ReactNode) {
  forgetToken();
  const queryClient = new QueryClient({ defaultOptions: { queries: { retry: false, networkMode: "always" } } });
  return render(
    <QueryClientProvider client={queryClient}>
      <MemoryRouter initialEntries={[address]}>
        <Suspense fallback={null}>
          {head}
          <Routes>
            {Object.entries(pages).map(([path, page]) => (
              <Route key={path} path={path} element={page} />
            ))}
          </Routes>
        </Suspense>
        <Where />
        <LiveRegion />
      </MemoryRouter>
    </QueryClientProvider>,
  );
}
