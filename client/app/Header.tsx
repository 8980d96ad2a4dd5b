import { Link, useLocation } from "react-router-dom";
import { useBasketCount } from "../lib/basket";
import { useSessionUser } from "../lib/session";
import { Mark } from "../ui/Mark";

const places = [
  { to: "/find", words: "Find" },
  { to: "/families", words: "Families" },
  { to: "/workshops", words: "Workshops" },
  { to: "/gauges", words: "Gauge desk" },
];

function Account() {
  const user = useSessionUser();
  // Nothing until it is known, so that "Sign in" does not flash at somebody who is.
  if (user === undefined) return <span className="inline-block min-w-14" />;
  if (user === null) return <HeaderLink to="/sign-in" words="Sign in" />;
  return <HeaderLink to="/account" words={user.displayName} />;
}

function HeaderLink({ to, words }: { to: string; words: string }) {
  const { pathname } = useLocation();
  const isHere = pathname === to || pathname.startsWith(`${to}/`);
  return (
    <Link
      to={to}
      aria-current={isHere ? "page" : undefined}
      className="inline-flex min-h-11 max-w-40 items-center border-b-2 border-transparent no-underline hover:border-rule aria-[current=page]:border-ink"
    >
      <span className="truncate">{words}</span>
    </Link>
  );
}

export function Header() {
  const count = useBasketCount();
  return (
    <header className="border-b border-rule bg-ground print:hidden">
      <div className="page flex flex-wrap items-center gap-x-6 py-2">
        <Link to="/" className="mr-2 inline-flex min-h-11 items-center gap-2.5 no-underline">
          <Mark />
          <span className="text-step2 font-extrabold tracking-tight">Idlewright</span>
        </Link>
        <nav aria-label="Main" className="order-3 flex w-full flex-wrap gap-x-5 sm:gap-x-6 md:order-none md:w-auto">
          {places.map((place) => (
            <HeaderLink key={place.to} {...place} />
          ))}
        </nav>
        <div className="ml-auto flex gap-x-6">
          <HeaderLink to="/basket" words={count ? `Basket ${count}` : "Basket"} />
          <Account />
        </div>
      </div>
    </header>
  );
}
