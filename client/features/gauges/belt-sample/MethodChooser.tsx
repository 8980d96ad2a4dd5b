import { type BeltSampleMethod, beltSampleMethods } from "#shared/domain/beltSample";
import { SketchDrawing } from "../../../ui/measuring/SketchDrawing";
import { methodSketches } from "./methodSketches";
import { methodWords } from "./methodWords";

type Props = { method: BeltSampleMethod; onMethod: (method: BeltSampleMethod) => void };

/** How the sample is measured: five drawings to choose from. */
export function MethodChooser({ method, onMethod }: Props) {
  return (
    <fieldset className="mb-4">
      <legend className="sr-only">How it is measured</legend>
      <div className="grid gap-2 sm:grid-cols-3 lg:grid-cols-5 print:grid-cols-5">
        {beltSampleMethods.map((one) => (
          <MethodCard key={one} method={one} isChosen={one === method} onMethod={onMethod} />
        ))}
      </div>
    </fieldset>
  );
}

function MethodCard({ method, isChosen, onMethod }: Props & { isChosen: boolean }) {
  const { name, how } = methodWords[method];
  return (
    <label
      className={`grid cursor-pointer grid-cols-[6.5rem_minmax(0,1fr)] items-center gap-x-3 border border-edge bg-sheet px-3 py-2 has-checked:border-measured has-checked:outline-1 has-checked:outline-measured has-focus-visible:outline-2 has-focus-visible:outline-focus sm:grid-cols-1 sm:content-start sm:items-start ${isChosen ? "" : "print:hidden"}`}
    >
      <input
        type="radio"
        name="method"
        value={method}
        checked={isChosen}
        onChange={() => onMethod(method)}
        className="sr-only"
      />
      <span aria-hidden="true" className="sm:mb-1">
        <SketchDrawing sketch={methodSketches[method]} label={name} className="h-auto w-full" />
      </span>
      <span className="grid">
        <span className={isChosen ? "font-bold text-measured" : "font-semibold"}>{name}</span>
        <span className="text-small text-soft">{how}</span>
      </span>
    </label>
  );
}
