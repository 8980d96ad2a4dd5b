import { type BeltSampleMethod, beltSampleMethods } from "#shared/domain/beltSample";
import { SketchDrawing } from "../../../ui/measuring/SketchDrawing";
import { PictureChoice } from "../PictureChoice";
import { methodSketches } from "./methodSketches";
import { methodWords } from "./methodWords";

type Props = { method: BeltSampleMethod; onMethod: (method: BeltSampleMethod) => void };

const pictureOf = (method: BeltSampleMethod) => (
  <SketchDrawing sketch={methodSketches[method]} label={methodWords[method].name} className="h-auto w-full" />
);
const choices = beltSampleMethods.map((method) => ({
  value: method,
  name: methodWords[method].name,
  words: methodWords[method].how,
  picture: pictureOf(method),
}));

/** How the sample is measured: five drawings to choose from. */
export function MethodChooser({ method, onMethod }: Props) {
  return (
    <PictureChoice
      legend="How it is measured"
      name="method"
      value={method}
      onChoose={onMethod}
      columns="sm:grid-cols-3 lg:grid-cols-5 print:grid-cols-5"
      isListOnPhone
      choices={choices}
    />
  );
}
