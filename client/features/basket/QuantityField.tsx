import type { KeyboardEvent } from "react";
import { Button } from "../../ui/Button";
import type { useQuantity } from "./useQuantity";

export const quantityId = (partId: string): string => `quantity-${partId}`;

type Props = { partId: string; title: string; quantity: ReturnType<typeof useQuantity> };

const step =
  "grid size-10 cursor-pointer place-content-center border border-edge text-step1 hover:bg-ink hover:text-ground disabled:cursor-default disabled:border-rule disabled:bg-transparent disabled:text-soft pointer-coarse:size-11";

/** How many: typed, or one more and one fewer. */
export function QuantityField({ partId, title, quantity }: Props) {
  const { text, message, mayRetry, isPending } = quantity;
  const id = quantityId(partId);
  const onKeyDown = (event: KeyboardEvent) => {
    const by = { ArrowUp: 1, ArrowDown: -1 }[event.key];
    if (event.key === "Enter") quantity.sendNow();
    if (by === undefined) return;
    event.preventDefault();
    quantity.step(by);
  };
  return (
    <div className="grid justify-items-start gap-1.5">
      <div className="flex">
        <button
          type="button"
          className={step}
          aria-label={`One fewer: ${title}`}
          disabled={text.trim() === "1"}
          onClick={() => quantity.step(-1)}
        >
          −
        </button>
        <input
          id={id}
          className="h-10 w-13 border-y border-edge bg-sheet text-center font-semibold aria-invalid:border-outband pointer-coarse:h-11"
          inputMode="numeric"
          autoComplete="off"
          aria-label={`Quantity: ${title}`}
          aria-invalid={message ? true : undefined}
          aria-describedby={message ? `${id}-error` : undefined}
          value={text}
          onChange={(event) => quantity.change(event.target.value)}
          onKeyDown={onKeyDown}
          onBlur={quantity.sendNow}
        />
        <button
          type="button"
          className={step}
          aria-label={`One more: ${title}`}
          disabled={text.trim() === "99"}
          onClick={() => quantity.step(1)}
        >
          +
        </button>
      </div>
      {message && (
        <p id={`${id}-error`} role="alert" className="font-semibold text-outband">
          {message}
        </p>
      )}
      {mayRetry && (
        <Button look="quiet" onClick={quantity.retry} disabled={isPending}>
          Try again
        </Button>
      )}
    </div>
  );
}
