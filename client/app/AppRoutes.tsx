import { lazy } from "react";
import { Route, Routes } from "react-router-dom";
import { Layout } from "./Layout";
import { NotFoundPage } from "./NotFoundPage";

// Each page is fetched when it is first opened.
const HomePage = lazy(async () => ({ default: (await import("../features/search/HomePage")).HomePage }));
const ResultsPage = lazy(async () => ({ default: (await import("../features/search/ResultsPage")).ResultsPage }));

/**
 * Every address and its page. Declarative on purpose: the router with loaders weighs 18 kB more (gzip), and queries
 * start and keep what the pages need.
 */
export function AppRoutes() {
  return (
    <Routes>
      <Route element={<Layout hasStrip />}>
        <Route index element={<HomePage />} />
        <Route path="find" element={<ResultsPage />} />
      </Route>
      <Route element={<Layout />}>
        <Route path="*" element={<NotFoundPage />} />
      </Route>
    </Routes>
  );
}
