/** How far an arrow key moves, mm: 1, with Shift 10, with Alt a tenth. */
export const keyStep = ({ shiftKey, altKey }: { shiftKey: boolean; altKey: boolean }): number =>
  altKey ? 0.1 : shiftKey ? 10 : 1;
