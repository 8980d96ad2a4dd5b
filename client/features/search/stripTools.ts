import { parseSize } from "#shared/domain/parseSize";
import { AsNewLine } from "./AsNewLine";
import { BeltSampleLine } from "./BeltSampleLine";
import { NoSampleLine } from "./NoSampleLine";

/** What the strip needs as soon as somebody writes into it, fetched in one piece. */
export const stripTools = { parseSize, AsNewLine, BeltSampleLine, NoSampleLine };
