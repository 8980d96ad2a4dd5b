import { Suspense, useEffect, useRef } from "react";
import { Outlet, useLocation } from "react-router-dom";
import { StripBar } from "../features/search/StripBar";
import { ErrorBoundary } from "./ErrorBoundary";
import { Footer } from "./Footer";
import { Header } from "./Header";
import { LiveRegion } from "./LiveRegion";
import { useScrollPosition } from "./useScrollPosition";

/** Moves focus to a new page's content, so that a keyboard or a screen reader does not stay on the link that led there. */
function useFocusOnNewPage() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const seen = useRef(pathname);
  useEffect(() => {
    if (seen.current === pathname) return;
    seen.current = pathname;
    main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}

/** What every page has around it; public pages have the measure strip at their head. */
export function Layout({ hasStrip = false }: { hasStrip?: boolean }) {
  const main = useFocusOnNewPage();
  const { pathname } = useLocation();
  useScrollPosition();
  return (
    <div className="flex min-h-dvh flex-col">
      <a href="#main" className="absolute left-2 z-30 -translate-y-20 bg-ink px-4 py-3 text-ground focus:translate-y-2">
        Skip to the content
      </a>
      <Header />
      {/* The page comes with the strip, never before it: else it would be pushed down. */}
      <Suspense fallback={<div className="min-h-dvh" />}>
        {hasStrip && <StripBar />}
        <main id="main" ref={main} tabIndex={-1} className="min-h-[85dvh] flex-1">
          <ErrorBoundary resetKey={pathname}>
            <Suspense fallback={null}>
              <Outlet />
            </Suspense>
          </ErrorBoundary>
        </main>
      </Suspense>
      <Footer />
      <LiveRegion />
    </div>
  );
}
