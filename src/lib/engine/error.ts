/** A broken contract inside the engine: short, with quantity, rule and value. Never a bad file, never a risky design. */
export class EngineError extends Error {
  override readonly name = 'EngineError';
}

/** Throws unless `value` is finite and above zero (NaN fails too). */
export function requirePositive(value: number, quantity: string): number {
  if (!(value > 0 && value < Infinity)) throw new EngineError(`${quantity} must be > 0 (got ${value})`);
  return value;
}
