import { Link } from "react-router-dom";
import type { KitLine } from "#shared/drawing/KitLine";
import { KitDrawing } from "../../ui/drawing/KitDrawing";
import { exampleSizes } from "./exampleSizes";
import { GuideSection } from "./GuideSection";
import { measuringGuides } from "./measuringGuides";
import { Points } from "./Points";

const example = (
  label: string,
  kind: "idler-wheel" | "drive-ring" | "motor-mount",
  names: readonly string[],
): KitLine => ({
  label,
  kind,
  dims: Object.fromEntries(
    Object.entries(exampleSizes[kind])
      .filter(([name]) => names.includes(name))
      .map(([name, nominalMm]) => [name, { nominalMm }]),
  ),
});
const lines: readonly KitLine[] = [
  example("platter idler", "idler-wheel", ["outsideDiameter", "bore", "treadWidth", "overallHeight"]),
  example("take-up ring", "drive-ring", ["insideDiameter", "section"]),
  { ...example("motor mounts", "motor-mount", Object.keys(exampleSizes["motor-mount"])), quantity: 3 },
  { label: "circlip" },
];

/** A kit is measured through its lines. */
export function KitGuide() {
  return (
    <>
      <KitDrawing lines={lines} className="mt-4" />
      <p className="text-small text-soft">
        A kit as it is shown: each part drawn from its own numbers, all at one scale.
      </p>
      <GuideSection title="A kit is as good as its lines">
        <Points
          points={[
            "A kit has no size of its own. Each of its lines is a part with sizes, or a plain item such as grease or a circlip.",
            "Measure each worn part by the guide of its kind, and search for each. A kit is found through any line that fits.",
            "Before you buy, compare every line with your readings: one line that is off spoils the saving.",
            "Look at what is not in the kit. A set for the record side may leave out the mounts of the motor.",
            "Do not go by the name on the box: the same mechanism was sold under many badges, and one badge used several mechanisms.",
            "Plain items are not measured and count for nothing in the fit chance.",
          ]}
        />
      </GuideSection>
      <GuideSection title="Measure each part">
        <ul className="grid gap-x-10 sm:grid-cols-2">
          {measuringGuides.map(({ slug, title }) => (
            <li key={slug}>
              <Link to={`/guides/${slug}`} className="inline-flex min-h-8 items-center">
                {title}
              </Link>
            </li>
          ))}
        </ul>
      </GuideSection>
    </>
  );
}
