import { useEffect, useRef } from "react";
import type { BasketLine } from "#shared/schemas/basket";
import { Button } from "../../ui/Button";
import { usePutLine } from "./api";
import { quantityId } from "./QuantityField";

/** Stands where a line was taken out, and puts it back. Takes the focus that the line had, so that it is read out too. */
export function RemovedRow({ line, shipTo }: { line: BasketLine; shipTo: string }) {
  const put = usePutLine(shipTo);
  const button = useRef<HTMLButtonElement>(null);
  useEffect(() => button.current?.focus({ preventScroll: true }), []);

  const { part, quantity, forNeed } = line;
  const wordsId = `removed-${part.id}`;
  const putBack = async () => {
    try {
      await put.mutateAsync({ partId: part.id, quantity, ...(forNeed ? { forNeed } : {}) });
    } catch {
      return; // Told below, by `put.error`.
    }
    requestAnimationFrame(() => document.getElementById(quantityId(part.id))?.focus());
  };
  return (
    <li className="flex flex-wrap items-center gap-x-3 gap-y-1 border-b border-rule py-4">
      <p id={wordsId}>Removed {part.title}.</p>
      <Button
        ref={button}
        look="quiet"
        aria-describedby={wordsId}
        disabled={put.isPending}
        onClick={() => void putBack()}
      >
        Put it back
      </Button>
      {put.isError && (
        <p role="alert" className="font-semibold text-outband">
          It could not be put back: {put.error.message}
        </p>
      )}
    </li>
  );
}
