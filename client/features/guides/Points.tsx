/** Short sentences, one to a line. */
export function Points({ points }: { points: readonly string[] }) {
  return (
    <ul className="grid max-w-prose list-disc gap-1.5 pl-5 marker:text-soft">
      {points.map((point) => (
        <li key={point}>{point}</li>
      ))}
    </ul>
  );
}
