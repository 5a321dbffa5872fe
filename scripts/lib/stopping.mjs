// Hears that the program should end.
const signals = { SIGINT: 130, SIGTERM: 143, SIGHUP: 129 };

/** Calls `stop` once, with the exit code to use, on Ctrl-C, on a signal to end, or when npm is gone. */
export function whenStopped(stop) {
  let called = false;
  const once = (code) => {
    if (called) return;
    called = true;
    stop(code);
  };
  for (const [signal, code] of Object.entries(signals)) process.on(signal, () => once(code));
  // npm hands signals to a shell, and the shell does not hand them on: all that is seen is that it went away.
  if (process.env.npm_lifecycle_event === undefined) return;
  const parent = process.ppid;
  setInterval(() => process.ppid !== parent && once(signals.SIGTERM), 500).unref();
}
