import { useEffect, useRef } from "react";
import { Button } from "../../ui/Button";
import { usePutLine } from "./api";
import { quantityId } from "./QuantityField";
import type { RemovedLine } from "./withRemoved";

type Props = { removed: Pick<RemovedLine, "line">; shipTo: string; onBack: () => void };

/** Stands where a line was taken out, and puts it back. Takes the focus that the line had. */
export function RemovedRow({ removed: { line }, shipTo, onBack }: Props) {
  const put = usePutLine(shipTo);
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => button.current?.focus({ preventScroll: true }), []);

  const { part, quantity, forNeed } = line;
  const onPutBack = () =>
    put.mutate(
      { partId: part.id, quantity, ...(forNeed ? { forNeed } : {}) },
      {
        onSuccess: () => {
          onBack();
          requestAnimationFrame(() => document.getElementById(quantityId(part.id))?.focus());
        },
      },
    );
  return (
    <li className="flex flex-wrap items-center gap-x-3 gap-y-1 border-b border-rule py-4">
      <p role="status">Removed {part.title}.</p>
      <Button ref={button} look="quiet" disabled={put.isPending} onClick={onPutBack}>
        Put it back<span className="sr-only">: {part.title}</span>
      </Button>
      {put.isError && (
        <p role="alert" className="font-semibold text-outband">
          It could not be put back: {put.error.message}
        </p>
      )}
    </li>
  );
}
