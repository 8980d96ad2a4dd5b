import type { ReactElement } from "react";
import { DimensionLine } from "../DimensionLine";
import { Pulley } from "./Pulley";
import { Ruler } from "./Ruler";

type Fills = { rubber: string; metal: string };
export type DeskDrawingName = keyof typeof deskDrawings;

const ink = "var(--color-ink)";
const measured = "var(--color-measured)";

/** A belt around three pulleys, its longest span measured. */
function BeltRoute() {
  return (
    <>
      <Pulley x={40} y={104} r={10} />
      <Pulley x={84} y={40} r={18} />
      <Pulley x={176} y={86} r={40} />
      <path
        d="M31.2 99.2L68.2 31.4A18 18 0 0 1 88.4 22.6L185.8 47.2A40 40 0 0 1 172.4 125.8L39.1 114.0A10 10 0 0 1 31.2 99.2Z"
        fill="none"
        stroke={ink}
        strokeWidth={4}
        strokeLinejoin="round"
      />
      <circle cx={40} cy={104} r={3} fill={measured} />
      <circle cx={84} cy={40} r={3} fill={measured} />
      <circle cx={176} cy={86} r={3} fill={measured} />
    </>
  );
}

/** A belt laid flat along a ruler. */
function BeltSample({ rubber }: Fills) {
  return (
    <>
      <path
        d="M48 46H192A15 15 0 0 1 192 76H48A15 15 0 0 1 48 46ZM48 53A8 8 0 0 0 48 69H192A8 8 0 0 0 192 53Z"
        fill={rubber}
        fillRule="evenodd"
        stroke={ink}
        strokeWidth={1.2}
      />
      <path d="M40 40V26M200 40V26" stroke="var(--color-soft)" strokeWidth={0.9} />
      <DimensionLine from={{ x: 40, y: 30 }} to={{ x: 200, y: 30 }} text="inside, laid flat" colour="measured" />
      <path d="M20 96H220V132H20Z" fill="var(--color-sheet)" stroke={ink} strokeWidth={1.2} />
      <Ruler x={40} y={96} step={8} count={20} />
    </>
  );
}

/** Motor step, idler and rim, each turning the next. */
function Speed() {
  return (
    <>
      <circle cx={240} cy={75} r={96} fill="none" stroke={ink} strokeWidth={1.6} />
      <circle cx={240} cy={75} r={89} fill="none" stroke={ink} strokeWidth={0.9} />
      <circle cx={110} cy={75} r={34} fill="var(--color-rubber)" stroke={ink} strokeWidth={1.2} />
      <Pulley x={110} y={75} r={24} />
      <Pulley x={63} y={75} r={13} />
      <path d="M44 66A21 21 0 0 1 58 55M96 30A47 47 0 0 0 76 40" fill="none" stroke={measured} strokeWidth={2} />
      <path d="M64.5 53l-8 -3.5l1.500 8zM71.500 43.5l8.500 -2l-5 -5.500z" fill={measured} />
      <text x={186} y={80} textAnchor="middle" fontSize={17} fontWeight={700} fill={ink}>
        33 1/3
      </text>
      <text x={186} y={98} textAnchor="middle" fontSize={12.5} fill="var(--color-soft)">
        a minute
      </text>
    </>
  );
}

/** The edge of a part and what four classes allow. */
function Tolerances({ rubber }: Fills) {
  return (
    <>
      <path d="M88 48H152V132H88Z" fill="var(--color-inband-fill)" />
      <path d="M88 48V132M152 48V132" stroke="var(--color-inband)" strokeDasharray="3 3" />
      <path d="M0 16H120V42H0Z" fill={rubber} stroke={ink} strokeWidth={1.4} />
      {[16, 26, 48, 92].map((half, i) => (
        <path
          key={half}
          d={`M${120 - half} ${56 + i * 20}h${2 * half}v10h${-2 * half}z`}
          fill="var(--color-sheet)"
          stroke={half > 32 ? "var(--color-outband)" : ink}
          strokeWidth={1.3}
        />
      ))}
      <path d="M120 42V136" stroke={measured} strokeWidth={1.8} />
      <Ruler x={10} y={136} step={11} count={20} />
    </>
  );
}

/** A ring on its seat, as it was before dashed; standard sizes on a rail below. */
function ORings({ metal }: Fills) {
  return (
    <>
      <circle cx={76} cy={62} r={38} fill={metal} stroke={ink} strokeWidth={1.2} />
      <circle cx={76} cy={62} r={44} fill="none" stroke="var(--color-rubber)" strokeWidth={11} />
      <circle cx={76} cy={62} r={49.5} fill="none" stroke="var(--color-rubber-hatch)" strokeWidth={0.8} />
      <circle cx={76} cy={62} r={33} fill="none" stroke={ink} strokeDasharray="4 3" strokeWidth={1.2} />
      <path d="M142 76h84v18h-84z" fill={metal} stroke={ink} strokeWidth={1.2} />
      <circle cx={184} cy={53} r={23} fill="var(--color-rubber)" stroke={ink} />
      <circle cx={184} cy={50} r={26} fill="none" stroke={ink} strokeDasharray="4 3" strokeWidth={1.2} />
      <path d="M104 116h44v20h-44z" fill="var(--color-measured-fill)" />
      <Ruler x={10} y={136} step={11} count={20} />
      {[30, 78, 126, 174, 222].map((x) => (
        <g key={x}>
          <path d={`M${x - 11} 126h22m-22 -3v6m22 -6v6`} stroke={ink} />
          <circle
            cx={x}
            cy={126}
            r={4}
            fill={x === 126 ? "var(--color-inband)" : "var(--color-sheet)"}
            stroke={x === 126 ? "var(--color-inband)" : "var(--color-soft)"}
            strokeWidth={1.5}
          />
        </g>
      ))}
    </>
  );
}

/** A sheet of paper with a stroboscope ring, a ring to lay a part on and the bar that checks the printer. */
function Sheets() {
  const bars = Array.from({ length: 36 }, (_, i) => (i * 2 * Math.PI) / 36);
  const at = (angle: number, r: number) =>
    `${(104 + r * Math.cos(angle)).toFixed(2)} ${(62 + r * Math.sin(angle)).toFixed(2)}`;
  return (
    <>
      <path d="M56 8H184V142H56Z" fill="var(--color-ground)" stroke={ink} strokeWidth={1.2} />
      <path d={bars.map((angle) => `M${at(angle, 28)}L${at(angle, 38)}`).join("")} stroke={ink} strokeWidth={3.2} />
      <circle cx={104} cy={62} r={3} fill="none" stroke={ink} />
      <circle cx={160} cy={40} r={12} fill="none" stroke={ink} />
      <circle cx={160} cy={84} r={15} fill="none" stroke={ink} />
      <DimensionLine from={{ x: 72, y: 128 }} to={{ x: 168, y: 128 }} text="100 mm" colour="measured" />
      <path d="M72 121v14M168 121v14" stroke={measured} />
    </>
  );
}

export const deskDrawings = {
  "belt-route": BeltRoute,
  "belt-sample": BeltSample,
  speed: Speed,
  tolerances: Tolerances,
  "o-rings": ORings,
  sheets: Sheets,
} satisfies Record<string, (fills: Fills) => ReactElement>;
