import fc from "fast-check";

/** One seed for the whole run, printed by the test command, so that a failure can be repeated. */
const seed = process.env.FAST_CHECK_SEED;
if (seed) fc.configureGlobal({ seed: Number(seed) });
