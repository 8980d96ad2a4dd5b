import { type ReactNode, Suspense } from "react";
import { Link, useParams } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { type Guide, guides } from "./guides";

/** The guide that the address names; `notFound` where there is none of that name. */
export function GuidePage({ notFound }: { notFound: ReactNode }) {
  const { slug } = useParams();
  const at = guides.findIndex((guide) => guide.slug === slug);
  const guide = guides[at];
  if (!guide) return notFound;
  return <Article guide={guide} next={guides[at + 1] ?? guides[0]!} />;
}

function Article({ guide, next }: { guide: Guide; next: Guide }) {
  const { title, summary, Body } = guide;
  useTitle(title);
  return (
    <article className="page pb-8">
      <header className="grid gap-1 pt-6 pb-2">
        <nav aria-label="Where this is" className="text-small print:hidden">
          <Link to="/guides" className="inline-flex min-h-6 items-center">
            Guides
          </Link>
        </nav>
        <h1>{title}</h1>
        <p className="max-w-prose text-step1 text-soft">{summary}</p>
      </header>
      <Suspense fallback={<div className="min-h-dvh" />}>
        <Body guide={guide} />
      </Suspense>
      <nav aria-label="Next guide" className="mt-10 border-t border-rule pt-4 print:hidden">
        Next:{" "}
        <Link to={`/guides/${next.slug}`} className="inline-flex min-h-8 items-center font-semibold">
          {next.title}
        </Link>
      </nav>
    </article>
  );
}
