const [width, height] = [36, 44];

/** Where the handle on the rim of a pulley lies, px: to its right, as large as a fingertip. */
export const rimHandleBox = ({ x, y }: { x: number; y: number }, radius: number) => ({
  x: x + radius + 4 + width / 2,
  y,
  width,
  height,
});
