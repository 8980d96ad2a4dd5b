/** @type {(() => unknown)[]} */
const stops = [];

/**
 * Remembers how to undo something that was started. Gives the function that forgets it again.
 * @param {() => unknown} stop
 */
export function onStop(stop) {
  stops.push(stop);
  return () => {
    const at = stops.indexOf(stop);
    if (at >= 0) stops.splice(at, 1);
  };
}

/** Undoes all of it, what was started last first. A failure of one does not keep the others. */
export async function stopAll() {
  for (let stop = stops.pop(); stop; stop = stops.pop()) {
    try {
      await stop();
    } catch (error) {
      process.stderr.write(`  while stopping: ${error instanceof Error ? error.message : error}\n`);
    }
  }
}

/**
 * Calls `onSignal` once, for the first signal that asks this process to end. Later ones are let pass: a terminal and
 * npm each send one for the same Ctrl-C.
 * @param {(signal: string) => void} onSignal
 */
export function listenForStop(onSignal) {
  let told = false;
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) {
    process.on(signal, () => {
      if (told) return;
      told = true;
      onSignal(signal);
    });
  }
  // A closed terminal must not end us before what we started has ended.
  for (const stream of [process.stdout, process.stderr]) stream.on("error", () => undefined);
}
