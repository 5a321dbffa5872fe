/**
 * Refusals of bad arguments. Every function of this folder calls these first, so that a wrong unit or a
 * NaN stops where it enters and never becomes a plausible-looking force.
 * Each throws a RangeError that names the parameter and its bound.
 */

/** A finite number of any sign. */
export function requireFinite(name: string, value: number): void {
  if (!Number.isFinite(value)) throw new RangeError(`${name} must be a finite number, got ${value}`);
}

/** A finite number greater than zero. */
export function requirePositive(name: string, value: number): void {
  if (!(Number.isFinite(value) && value > 0)) {
    throw new RangeError(`${name} must be greater than 0, got ${value}`);
  }
}

/** A finite number of zero or more. */
export function requireNotNegative(name: string, value: number): void {
  if (!(Number.isFinite(value) && value >= 0)) {
    throw new RangeError(`${name} must be 0 or more, got ${value}`);
  }
}

/** A finite number with `low < value <= high`. */
export function requireWithin(name: string, value: number, low: number, high: number): void {
  if (!(value > low && value <= high)) {
    throw new RangeError(`${name} must be greater than ${low} and at most ${high}, got ${value}`);
  }
}

/** A whole number of `low` or more. */
export function requireCount(name: string, value: number, low: number): void {
  if (!(Number.isInteger(value) && value >= low)) {
    throw new RangeError(`${name} must be a whole number of ${low} or more, got ${value}`);
  }
}
