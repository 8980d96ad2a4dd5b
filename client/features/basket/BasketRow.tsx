import { useEffect } from "react";
import { formatMoney } from "#shared/domain/money";
import type { BasketLine } from "#shared/schemas/basket";
import { Button } from "../../ui/Button";
import type { ComparedScale } from "../../ui/drawing/comparedScale";
import { LineRow } from "../../ui/LineRow";
import { MadeToSize } from "../../ui/MadeToSize";
import { Money } from "../../ui/Money";
import { useRemoveLine } from "./api";
import { captionOf, drawnOf } from "./drawnOf";
import { KitContents } from "./KitContents";
import { QuantityField } from "./QuantityField";
import { useQuantity } from "./useQuantity";

export const lineId = (partId: string): string => `line-${partId}`;

type Props = {
  line: BasketLine;
  shipTo: string;
  scale: ComparedScale;
  /** It is about to be taken out: what could put it back is kept from now on. */
  onRemove: () => void;
  /** Whether a quantity stands in the field that the basket did not take. */
  onUnsettled: (partId: string, isUnsettled: boolean) => void;
};

/** A line of the basket that can be changed. */
export function BasketRow({ line, shipTo, scale, onRemove, onUnsettled }: Props) {
  const { part, problem, lineMinor, unitMinor } = line;
  const quantity = useQuantity(line, shipTo);
  const remove = useRemoveLine(shipTo);
  const isUnsettled = quantity.message !== null;
  useEffect(() => {
    onUnsettled(part.id, isUnsettled);
    return () => onUnsettled(part.id, false);
  }, [part.id, isUnsettled, onUnsettled]);

  const takeOut = () => {
    quantity.stopWaiting();
    onRemove();
    remove.mutate(part.id);
  };
  return (
    <LineRow
      id={lineId(part.id)}
      partId={part.id}
      title={part.title}
      kind={part.kind}
      dims={part.dimensions}
      drawn={drawnOf(part)}
      caption={captionOf(part)}
      material={part.material ?? undefined}
      forNeed={line.forNeed}
      scale={scale}
      isBusy={quantity.isPending || remove.isPending}
      notes={
        <>
          {part.kind === "rebuild-kit" && <KitContents lines={part.kitLines} />}
          {line.madeToSize && <MadeToSize />}
          {problem && <p className="font-semibold text-outband">{problem}</p>}
        </>
      }
      quantity={<QuantityField partId={part.id} title={part.title} quantity={quantity} />}
      price={
        <>
          <p className={`text-step1 font-bold ${problem ? "font-normal text-soft" : ""}`}>
            <Money minor={lineMinor} currency={part.currency} />
          </p>
          {problem ? (
            <p className="text-small text-soft">not in the sums</p>
          ) : (
            line.quantity > 1 && <p className="text-small text-soft">{formatMoney(unitMinor, part.currency)} each</p>
          )}
          <Button look="quiet" disabled={remove.isPending} onClick={takeOut}>
            Remove<span className="sr-only">: {part.title}</span>
          </Button>
          {remove.isError && (
            <p role="alert" className="font-semibold text-outband">
              It is still in the basket: {remove.error.message}
            </p>
          )}
        </>
      }
    />
  );
}
