import type { Photo } from "#shared/schemas/part";
import { RuledHeading } from "../../ui/RuledHeading";

/** What the workshop photographed; nothing where there is none. Each keeps its room until it is there. */
export function Photos({ photos }: { photos: readonly Photo[] }) {
  if (photos.length === 0) return null;
  return (
    <section className="print:hidden">
      <RuledHeading className="mt-6">{photos.length === 1 ? "Photo" : `Photos: ${photos.length}`}</RuledHeading>
      <ul className="mt-3 grid grid-cols-2 gap-3 sm:grid-cols-3">
        {photos.map(({ url, alt, width, height }) => (
          <li key={url}>
            <a href={url} className="block">
              <img
                src={url}
                alt={alt}
                width={width}
                height={height}
                loading="lazy"
                decoding="async"
                className="h-auto w-full border border-rule"
              />
            </a>
          </li>
        ))}
      </ul>
    </section>
  );
}
