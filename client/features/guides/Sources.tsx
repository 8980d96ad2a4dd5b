import { GuideSection } from "./GuideSection";
import { Points } from "./Points";

/** Where the figures of a guide come from. */
export function Sources({ sources }: { sources: readonly string[] }) {
  return (
    <GuideSection title="Sources">
      <Points points={sources} />
    </GuideSection>
  );
}
