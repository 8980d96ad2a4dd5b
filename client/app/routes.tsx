import type { RouteObject } from "react-router-dom";
import { ErrorPage } from "./ErrorPage";
import { Layout } from "./Layout";

/** Every address and the page that is fetched for it. A page module exports its page as `Component`. */
export const routes: RouteObject[] = [
  {
    element: <Layout />,
    errorElement: <ErrorPage />,
    children: [
      {
        errorElement: <ErrorPage />,
        children: [
          { index: true, lazy: () => import("../features/search/HomePage") },
          { path: "find", lazy: () => import("../features/search/ResultsPage") },
          { path: "*", lazy: () => import("./NotFoundPage") },
        ],
      },
    ],
  },
];
