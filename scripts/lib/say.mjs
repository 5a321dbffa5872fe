// What the scripts print: one plain line for each thing done.
const isTerminal = process.stdout.isTTY === true;
const bold = (text) => (isTerminal ? `\u001b[1m${text}\u001b[0m` : text);

/** A heading for a stage of work. */
export const heading = (text) => console.log(`\n${bold(text)}`);

/** One line about what is being done or was found. */
export const say = (text) => console.log(`  ${text}`);

/** Seconds since `start` (from `Date.now()`), for a person. */
export const since = (start) => {
  const seconds = (Date.now() - start) / 1000;
  return seconds < 90
    ? `${seconds.toFixed(1)} s`
    : `${Math.floor(seconds / 60)} min ${Math.round(seconds % 60)} s`;
};

/** Ends the program with a sentence a person can act on; the stack only when asked for. */
export function fail(error) {
  console.error(`\nByssus could not go on: ${error instanceof Error ? error.message : String(error)}`);
  if (process.env.BYSSUS_DEBUG && error instanceof Error) console.error(error.stack);
  process.exitCode = 1;
}
