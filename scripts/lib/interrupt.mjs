import { constants } from "node:os";

/** Thrown by whatever was under way when the person asked us to stop. */
export class Interrupted extends Error {
  /** @param {NodeJS.Signals} name the first signal that came */
  constructor(name) {
    super(`Stopped by ${name}`);
    this.name = "Interrupted";
    this.exitCode = 128 + constants.signals[name];
  }
}

/**
 * Turns Ctrl-C, a SIGTERM and a closed terminal into one AbortSignal. The same request often comes twice
 * (from the terminal and again from npm): only the first counts.
 * @returns {AbortSignal}
 */
export function watchInterrupts() {
  const controller = new AbortController();
  for (const name of ["SIGINT", "SIGTERM", "SIGHUP"]) {
    process.on(name, () => controller.abort(new Interrupted(name)));
  }
  return controller.signal;
}
