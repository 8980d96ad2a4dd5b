import { useRef } from "react";
import type { NeedDimension } from "#shared/schemas/need";
import type { Rail } from "#shared/schemas/search";
import { axisMarks } from "../../lib/axisMarks";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";
import { Button } from "../../ui/Button";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";
import { RailLabels } from "./RailLabels";
import { RailSlider } from "./RailSlider";
import { RailTicks } from "./RailTicks";
import { useRailView } from "./useRailView";

type Props = {
  rail: Rail;
  need: NeedDimension;
  /** The as-new size as it stands now, moved by hand or not. */
  estimateMm: number;
  unit: SizeUnit;
  /** The need without the moved estimate: another one begins a new view. */
  needKey: string;
  litId: string | null;
  onLight: (partId: string | null) => void;
  onPick: (partId: string) => void;
  onEstimate: (mm: number) => void;
};

const tall = { height: 132, top: 30, laneHeight: 16, lanes: 4, radius: 5, axis: 104 };
const flat = { height: 72, top: 18, laneHeight: 11, lanes: 2, radius: 4, axis: 50 };

/** A ruler, true to scale along the primary dimension: the estimate with its uncertainty, what is accepted, every part. */
export function SizeRail(props: Props) {
  const { rail, need, estimateMm, unit, needKey, litId, onLight, onPick, onEstimate } = props;
  const [place, width] = useOwnWidth(1000);
  const svg = useRef<SVGSVGElement>(null);
  const narrow = width < 560;
  const size = narrow ? flat : tall;
  const railView = useRailView(rail, estimateMm, needKey, narrow);
  const { view } = railView;
  const xOf = (mm: number) => ((mm - view.fromMm) / (view.toMm - view.fromMm)) * width;
  const toMm = (clientX: number) => {
    const box = svg.current?.getBoundingClientRect();
    return box ? view.fromMm + ((clientX - box.left) / box.width) * (view.toMm - view.fromMm) : estimateMm;
  };
  const moved = estimateMm - need.asNewMm;
  // A band reckoned around the need moves with it at once; that of a service point stays.
  const shift = need.bandFrom === "service-point" ? 0 : moved;
  const band = { fromMm: need.lowerMm + shift, toMm: need.upperMm + shift };
  const spread = 2 * need.standardUncertaintyMm;
  const laneBottom = size.top + size.lanes * size.laneHeight;

  return (
    <div className="rail">
      <div ref={place} className="rail-board" style={{ height: size.height }}>
        <svg ref={svg} width={width} height={size.height} className="block" aria-hidden="true">
          <rect
            x={xOf(band.fromMm)}
            y={size.top - 4}
            width={xOf(band.toMm) - xOf(band.fromMm)}
            height={size.axis - size.top + 4}
            fill="var(--color-inband-fill)"
          />
          <path
            d={[band.fromMm, band.toMm].map((mm) => `M${xOf(mm)} ${size.top - 4}V${size.axis}`).join("")}
            stroke="var(--color-inband)"
            strokeDasharray="3 3"
          />
          <rect
            x={xOf(estimateMm - spread)}
            y={size.top - 4}
            width={xOf(estimateMm + spread) - xOf(estimateMm - spread)}
            height={size.axis - size.top + 4}
            fill="var(--color-measured)"
            opacity={0.22}
          />
          <g>
            <path d={`M0 ${size.axis + 0.5}H${width}`} stroke="var(--color-ink)" />
            {axisMarks(view, width, unit).map(({ mm, label }) => (
              <g key={mm} transform={`translate(${xOf(mm).toFixed(1)} ${size.axis})`}>
                <path d={`M0 0V${label ? 7 : 4}`} stroke="var(--color-ink)" strokeWidth={label ? 1.2 : 0.8} />
                {label && xOf(mm) > 14 && xOf(mm) < width - 14 && (
                  <text y={20} textAnchor="middle" fontSize={13} fill="var(--color-ink)">
                    {label}
                  </text>
                )}
              </g>
            ))}
            {need.asFoundMm !== null && (
              <path
                d={`M${xOf(need.asFoundMm)} ${size.axis}v-18`}
                stroke="var(--color-measured)"
                strokeWidth={2}
                strokeDasharray="2 3"
              />
            )}
          </g>
          <RailTicks
            ticks={rail.ticks}
            xOf={xOf}
            width={width}
            top={size.top}
            laneHeight={size.laneHeight}
            lanes={size.lanes}
            overflowY={(laneBottom + size.axis) / 2 + 1}
            radius={size.radius}
            litId={litId}
            onLight={onLight}
            onPick={onPick}
          />
          <RailLabels
            estimateX={xOf(estimateMm)}
            estimate={roundedSize(estimateMm, unit)}
            bandFromX={xOf(band.fromMm)}
            bandToX={xOf(band.toMm)}
            band={`accepted ${roundedSize(band.fromMm, unit)} to ${roundedSize(band.toMm, unit)}`}
            width={width}
            y={size.top - 8}
          />
        </svg>
        <RailSlider
          valueMm={estimateMm}
          range={view}
          unit={unit}
          x={xOf(estimateMm)}
          top={size.top - 6}
          height={size.axis}
          toMm={toMm}
          onMove={(mm) => {
            railView.follow(mm);
            onEstimate(mm);
          }}
        />
      </div>
      <div className="rail-tools">
        <span className="text-soft">Look</span>
        <Button look="quiet" disabled={!railView.canGoCloser} onClick={railView.closer}>
          closer
        </Button>
        <Button look="quiet" disabled={!railView.canGoWider} onClick={railView.wider}>
          wider
        </Button>
        <Button look="quiet" disabled={!railView.canGoWider} onClick={railView.fit}>
          everything
        </Button>
      </div>
    </div>
  );
}
