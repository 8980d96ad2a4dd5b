import { Link } from "react-router-dom";
import type { PartSummary } from "#shared/schemas/part";
import { announce } from "../lib/announcements";
import { usePartInBasket, usePutInBasket } from "../lib/usePutInBasket";
import { Button, type ButtonLook } from "./Button";

type Props = {
  part: PartSummary;
  /** What it is for, in words, as it will stand on the basket and the order. */
  forNeed: string | null;
  quantity?: number;
  look?: ButtonLook;
  className?: string;
};

/** Puts a part in the basket, says so, and then says how many lie there. */
export function PutInBasket({ part, forNeed, quantity = 1, look = "outline", className = "" }: Props) {
  const put = usePutInBasket();
  const inBasket = usePartInBasket(part.id);
  if (part.available === 0) return <p className="font-semibold">None left</p>;

  const onPut = () => {
    const total = inBasket + quantity;
    put.mutate(
      { partId: part.id, quantity: total, ...(forNeed ? { forNeed: forNeed.slice(0, 200) } : {}) },
      { onSuccess: () => announce(`${part.title} is in the basket, ${total} of it.`) },
    );
  };
  return (
    <div className="grid justify-items-start gap-1.5">
      <Button look={look} className={className} disabled={put.isPending} onClick={onPut}>
        {inBasket > 0 ? "Put another in basket" : "Put in basket"}
        <span className="sr-only">: {part.title}</span>
      </Button>
      {inBasket > 0 && (
        <p className="text-small">
          <Link to="/basket" className="inline-flex min-h-6 items-center">
            {inBasket} in the basket
          </Link>
        </p>
      )}
      {put.isError && (
        <p role="alert" className="font-semibold text-outband">
          {put.error.message}
        </p>
      )}
    </div>
  );
}
