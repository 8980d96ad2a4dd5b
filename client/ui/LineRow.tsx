import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import type { ListingKind } from "#shared/domain/partKinds";
import type { StatedDimensions } from "#shared/schemas/part";
import { useUnit } from "../lib/preferences";
import { ComparedDrawing } from "./drawing/ComparedDrawing";
import type { ComparedScale, Drawable } from "./drawing/comparedScale";
import { SizesLine } from "./SizesLine";

type Props = {
  id?: string;
  /** Of its heading: one below that of its parcel. */
  level?: 3 | 4;
  partId: string;
  title: string;
  kind: ListingKind;
  dims: StatedDimensions;
  /** What is drawn; null for a kit whose lines are not known here. */
  drawn: Drawable | null;
  material?: string | undefined;
  /** Under the drawing: which part of a kit it shows. */
  caption?: string | undefined;
  forNeed: string | null;
  scale: ComparedScale;
  isBusy?: boolean;
  /** Below the sizes: what is particular about this line. */
  notes?: ReactNode;
  quantity: ReactNode;
  price: ReactNode;
};

/** A part that is being bought or was: drawn to scale, its sizes in a line, how many, how much. */
export function LineRow({ partId, title, kind, dims, drawn, material, forNeed, scale, isBusy, ...rest }: Props) {
  const unit = useUnit();
  const Heading = rest.level === 4 ? "h4" : "h3";
  return (
    <li
      id={rest.id}
      aria-busy={isBusy || undefined}
      className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-5 gap-y-3 border-b border-rule py-5 md:grid-cols-[auto_minmax(0,1fr)_10rem_8.5rem] print:break-inside-avoid"
    >
      {drawn ? (
        <ComparedDrawing part={drawn} scale={scale} unit={unit} material={material} caption={rest.caption} />
      ) : (
        <p className="grid h-[108px] w-[120px] place-content-center border border-dashed border-edge text-small text-soft">
          kit, not drawn
        </p>
      )}
      <div className="grid content-start gap-1">
        <Heading className="text-step1 font-semibold">
          <Link to={`/parts/${partId}`} className="inline-block min-h-6 no-underline hover:underline">
            {title}
          </Link>
        </Heading>
        {forNeed && <p>for: {forNeed}</p>}
        <SizesLine kind={kind} dims={dims} unit={unit} />
        {rest.notes}
      </div>
      <div className="col-span-2 flex items-start justify-between gap-4 md:contents">
        <div>{rest.quantity}</div>
        <div className="grid content-start justify-items-end gap-0.5 text-right">{rest.price}</div>
      </div>
    </li>
  );
}
