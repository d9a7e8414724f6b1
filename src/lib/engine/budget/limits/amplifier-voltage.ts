import { terminalVolts, type Limit } from './limit';

/** RMS volts the amplifier reaches at its terminals: max √(P·R) of its ratings. */
export const amplifierVoltage: Limit = {
  name: 'amplifier-voltage',
  quantity: terminalVolts,
  allowed: (w) => w.ceiling.volts
};
