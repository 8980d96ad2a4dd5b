/** @param {number} since milliseconds of performance.now() */
export const secondsSince = (since) => `${((performance.now() - since) / 1000).toFixed(1)} s`;

/** @param {string} text */
export const say = (text) => process.stdout.write(`${text}\n`);

/**
 * One step of a start: a line when it takes long, and one when it is done, with its time. The work may give words
 * for what it found; a step that gives null had nothing to do and says nothing.
 *
 * @param {string} name
 * @param {(note: (text: string) => void) => Promise<string | null | void>} work `note` prints a line within the step
 */
export async function step(name, work) {
  const since = performance.now();
  const note = (/** @type {string} */ text) => say(`  ${name.padEnd(10)} ${text}`);
  const outcome = await work(note);
  if (outcome !== null) note(`${outcome ?? "done"} (${secondsSince(since)})`);
}
