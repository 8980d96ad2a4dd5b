import { createElement, type ReactNode, useId } from "react";
import type { Scene, TextItem } from "#shared/drawing/Scene";
import { type SvgElement, sceneElements } from "#shared/drawing/sceneElements";
import { type ColourName, textColour } from "#shared/drawing/sceneStyle";
import { baselineOf, signPath, signRoom } from "#shared/drawing/signMark";

type SceneSvgProps = { scene: Scene; className?: string | undefined };

/** A scene in the page's colours (CSS variables, so that themes just work), with its text alternative. */
export function SceneSvg({ scene, className }: SceneSvgProps) {
  const id = useId();
  const elements = sceneElements(scene, {
    colour: variable,
    patternId: (material) => `${id}-${material}`,
    text: textElements,
  });
  const { width, height } = scene;
  return (
    <svg
      role="img"
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-desc`}
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className={className}
      fontFamily="inherit"
    >
      <title id={`${id}-title`}>{scene.title}</title>
      <desc id={`${id}-desc`}>{scene.description}</desc>
      {elements.map(toNode)}
    </svg>
  );
}

function variable(name: ColourName): string {
  return `var(--color-${name})`;
}

/** The words keep to the room that the layout gave them, whichever font the page ends up with. */
function textElements(item: TextItem): SvgElement[] {
  const { content, size, weight, sign, turned, box } = item;
  const { x, y } = baselineOf(item);
  const room = signRoom(item);
  const fill = variable(textColour(item.role));
  const transform = `translate(${x.toFixed(2)} ${y.toFixed(2)})${turned ? " rotate(-90)" : ""}`;
  const text: SvgElement = {
    tag: "text",
    attributes: {
      x: room,
      fill,
      fontSize: size,
      fontWeight: weight,
      fontVariant: "tabular-nums",
      textLength: ((turned ? box.height : box.width) - room).toFixed(2),
      lengthAdjust: "spacingAndGlyphs",
    },
    children: [{ tag: "#text", attributes: { content } }],
  };
  if (!sign) return [{ tag: "g", attributes: { transform }, children: [text] }];
  const mark = { d: signPath(sign, size), fill: "none", stroke: fill, strokeWidth: size * 0.085 };
  return [{ tag: "g", attributes: { transform }, children: [{ tag: "path", attributes: mark }, text] }];
}

function toNode({ tag, attributes, children }: SvgElement, index: number): ReactNode {
  if (tag === "#text") return attributes.content;
  return createElement(tag, { ...attributes, key: index }, ...(children ?? []).map(toNode));
}
