/** Electrical and acoustical units, time, air and wire. */
import { curved, imperial, metric, own, type Unit } from './unit';

export const FREQUENCY: readonly Unit[] = [own('Hz', ['hertz', 'cps']), metric('kHz', 1000, ['kilohertz'])];
export const LEVEL: readonly Unit[] = [own('dB', ['decibel', 'decibels', 'dB SPL', 'dBSPL'])];
export const POWER: readonly Unit[] = [
  own('W', ['watt', 'watts', 'W RMS', 'WRMS', 'watts RMS']),
  metric('kW', 1000, ['kilowatt', 'kilowatts']),
  metric('mW', 0.001, ['milliwatt', 'milliwatts'])
];
export const RESISTANCE: readonly Unit[] = [
  own('ohm', ['ohms', 'R', 'Ω', 'Ωs']),
  metric('mohm', 0.001, ['milliohm', 'milliohms', 'mΩ', 'mohms']),
  metric('kohm', 1000, ['kilohm', 'kilohms', 'kΩ', 'kohms'])
];
export const INDUCTANCE: readonly Unit[] = [
  own('mH', ['millihenry', 'millihenries', 'millihenrys']),
  metric('H', 1000, ['henry', 'henries', 'henrys']),
  metric('µH', 0.001, ['uH', 'microhenry', 'microhenries', 'microhenrys'])
];
export const VOLTAGE: readonly Unit[] = [
  own('V', ['volt', 'volts', 'V RMS', 'Vrms']),
  metric('mV', 0.001, ['millivolt', 'millivolts']),
  metric('kV', 1000)
];
export const CURRENT: readonly Unit[] = [
  own('A', ['amp', 'amps', 'ampere', 'amperes']),
  metric('mA', 0.001, ['milliamp', 'milliamps'])
];
export const TIME: readonly Unit[] = [
  own('ms', ['msec', 'millisecond', 'milliseconds']),
  metric('s', 1000, ['sec', 'second', 'seconds']),
  metric('µs', 0.001, ['us', 'microsecond', 'microseconds'])
];

const CELSIUS = ['C', 'celsius', 'deg C', 'degrees C', 'degrees celsius', 'centigrade'];
const FAHRENHEIT = ['F', 'fahrenheit', 'deg F', 'degrees F', 'degrees fahrenheit'];

/** Zero of the Fahrenheit scale at 32 below freezing, 1.8 degrees to the kelvin; exact. */
export const TEMPERATURE: readonly Unit[] = [
  own('°C', CELSIUS),
  curved(
    'K',
    ['kelvin', 'kelvins'],
    'metric',
    (kelvin) => kelvin - 273.15,
    (celsius) => celsius + 273.15
  ),
  curved(
    '°F',
    FAHRENHEIT,
    'imperial',
    (fahrenheit) => (fahrenheit - 32) / 1.8,
    (celsius) => celsius * 1.8 + 32
  )
];
export const TEMPERATURE_RISE: readonly Unit[] = [
  own('K', ['kelvin', 'kelvins']),
  metric('°C', 1, CELSIUS),
  imperial('°F', 1 / 1.8, FAHRENHEIT)
];

/** Pound-force per square inch, inch and millimetre of mercury: NIST Special Publication 811 (2008), appendix B. */
export const PRESSURE: readonly Unit[] = [
  own('kPa', ['kilopascal', 'kilopascals']),
  metric('hPa', 0.1, ['mbar', 'millibar', 'millibars']),
  metric('Pa', 0.001, ['pascal', 'pascals']),
  metric('bar', 100, ['bars']),
  metric('atm', 101.325, ['atmosphere', 'atmospheres']),
  metric('mmHg', 0.1333224, ['torr']),
  imperial('inHg', 3.386389, ['in Hg', 'inches of mercury', '"Hg']),
  imperial('psi', 6.894757, ['lb/sq in'])
];

export const RATIO: readonly Unit[] = [
  own('', ['x', '×', 'times']),
  metric('%', 0.01, ['percent', 'per cent', 'pct'])
];
export const SHARE: readonly Unit[] = [metric('%', 0.01, ['percent', 'per cent', 'pct']), own('of one')];

/** American wire gauge n: 0.127 mm · 92^((36 − n)/39) across, ASTM B258. */
const gaugeMillimetres = (gauge: number): number => 0.127 * 92 ** ((36 - gauge) / 39);

export const CROSS_SECTION: readonly Unit[] = [
  own('mm²', ['mm2', 'sq mm', 'square millimetres', 'square millimeters']),
  metric('cm²', 100, ['sq cm']),
  curved(
    'AWG',
    ['ga', 'gauge'],
    'imperial',
    (gauge) => (Math.PI / 4) * gaugeMillimetres(gauge) ** 2,
    (area) => 36 - (39 * Math.log(Math.sqrt((4 * area) / Math.PI) / 0.127)) / Math.log(92)
  )
];
