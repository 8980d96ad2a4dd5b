import type { DriveMap, ServicePoint } from "#shared/schemas/catalogue";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";
import { beltPath } from "./beltPath";
import { numberPlaces } from "./numberPlaces";

type Props = {
  map: DriveMap;
  points: readonly ServicePoint[];
  litId: string | null;
  onLight: (id: string | null) => void;
  onPick: (id: string) => void;
};

const rubberRoles: readonly DriveMap["wheels"][number]["role"][] = ["idler", "pinch-roller"];
const margin = 12;
const centred = { dx: 0, dy: 0 };

/** The drive from above, to scale: metal in brass, rubber in black, belts as lines, service points numbered to be picked. */
export function DriveMapDrawing({ map, points, litId, onLight, onPick }: Props) {
  const [place, width] = useOwnWidth(640);
  const scale = (width - 2 * margin) / map.widthMm;
  const height = map.heightMm * scale + 2 * margin;
  // The largest first, so that what lies on a platter is not hidden by it.
  const wheels = [...map.wheels].sort((a, b) => b.diameterMm - a.diameterMm);
  const places = numberPlaces(points, scale);
  const at = (xMm: number, yMm: number) => `translate(${margin + xMm * scale} ${margin + yMm * scale})`;
  return (
    <div ref={place} className="relative overflow-hidden">
      <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block" aria-hidden="true">
        {wheels.map(({ id, role, xMm, yMm, diameterMm }) => {
          const radius = (diameterMm / 2) * scale;
          const isRubber = rubberRoles.includes(role);
          const arm = radius + 6;
          return (
            <g key={id} transform={at(xMm, yMm)}>
              <circle
                r={radius}
                fill={
                  role === "platter" || role === "reel"
                    ? "none"
                    : isRubber
                      ? "var(--color-rubber)"
                      : "var(--color-metal-fill)"
                }
                stroke="var(--color-ink)"
                strokeWidth={1.5}
              />
              {isRubber && <circle r={radius * 0.74} fill="var(--color-metal-fill)" stroke="var(--color-ink)" />}
              <path
                d={`M${-arm} 0H${arm}M0 ${-arm}V${arm}`}
                stroke="var(--color-soft)"
                strokeWidth={0.8}
                strokeDasharray="10 3 2 3"
              />
            </g>
          );
        })}
        <g transform={`translate(${margin} ${margin}) scale(${scale})`}>
          {map.belts.map(({ wheels: ids, label }) => (
            <path
              key={label}
              d={beltPath(ids.flatMap((id) => map.wheels.find((wheel) => wheel.id === id) ?? []))}
              fill="none"
              stroke="var(--color-ink)"
              strokeWidth={3 / scale}
              strokeLinejoin="round"
            />
          ))}
        </g>
        {points.map(({ id, xMm, yMm }) => {
          const { dx, dy } = places.get(id) ?? centred;
          return (
            <path
              key={id}
              transform={at(xMm, yMm)}
              d={`M0 0L${dx} ${dy}`}
              stroke="var(--color-measured)"
              strokeWidth={1.4}
            />
          );
        })}
      </svg>
      {points.map(({ id, number, name, xMm, yMm }) => {
        const { dx, dy } = places.get(id) ?? centred;
        return (
          <button
            key={id}
            type="button"
            className="drive-point"
            data-lit={litId === id || undefined}
            style={{ left: margin + xMm * scale + dx, top: margin + yMm * scale + dy }}
            onPointerEnter={() => onLight(id)}
            onPointerLeave={() => onLight(null)}
            onFocus={() => onLight(id)}
            onBlur={() => onLight(null)}
            onClick={() => onPick(id)}
          >
            <span>{number}</span>
            <span className="sr-only">: {name}</span>
          </button>
        );
      })}
    </div>
  );
}
