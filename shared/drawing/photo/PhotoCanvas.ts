/** Collects the markup of a picture: what is painted, in order, and the gradients it needs. */
export class PhotoCanvas {
  private readonly definitions: string[] = [];
  private readonly painted: string[] = [];

  add(markup: string): void {
    this.painted.push(markup);
  }

  /** Keeps a definition and gives the id to refer to it by. `make` is handed that id. */
  define(make: (id: string) => string): string {
    const id = `p${this.definitions.length}`;
    this.definitions.push(make(id));
    return id;
  }

  /** A gradient along a line given in px, as a fill. Stops are [offset, colour, opacity]. */
  linear(x1: number, y1: number, x2: number, y2: number, stops: readonly Stop[]): string {
    const ends = `x1="${f(x1)}" y1="${f(y1)}" x2="${f(x2)}" y2="${f(y2)}"`;
    return `url(#${this.define((id) => `<linearGradient id="${id}" gradientUnits="userSpaceOnUse" ${ends}>${stopsOf(stops)}</linearGradient>`)})`;
  }

  /** A gradient outwards from the middle of whatever it fills. */
  radial(stops: readonly Stop[]): string {
    return `url(#${this.define((id) => `<radialGradient id="${id}">${stopsOf(stops)}</radialGradient>`)})`;
  }

  toSvg(width: number, height: number): string {
    const size = `width="${width}" height="${height}" viewBox="0 0 ${width} ${height}"`;
    return `<svg xmlns="http://www.w3.org/2000/svg" ${size}><defs>${this.definitions.join("")}</defs>${this.painted.join("")}</svg>`;
  }
}

export type Stop = readonly [offset: number, colour: string, opacity?: number];

function stopsOf(stops: readonly Stop[]): string {
  return stops
    .map(([at, colour, opacity = 1]) => `<stop offset="${at}" stop-color="${colour}" stop-opacity="${opacity}"/>`)
    .join("");
}

/** A coordinate, short. */
export function f(px: number): string {
  return px.toFixed(1);
}
