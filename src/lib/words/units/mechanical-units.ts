/**
 * Lengths, areas, volumes, masses and the mechanics of a driver.
 * Inch, foot and pound: International yard and pound agreement, 1959 (1 ft = 0.3048 m, 1 in = 25.4 mm, 1 lb = 0.45359237 kg), exact.
 * Gallons: the US one is 231 cubic inches, the imperial one 4.54609 L (Weights and Measures Act 1985), both exact.
 */
import { imperial, metric, own, type Unit } from './unit';

const INCH_MM = 25.4;
const FOOT_M = 0.3048;
const POUND_KG = 0.45359237;
/** 12 inches cubed, in litres: 28.316846592. */
const CUBIC_FOOT_L = (FOOT_M * 10) ** 3;
const CUBIC_INCH_L = (INCH_MM / 100) ** 3;

const MM = ['millimetre', 'millimetres', 'millimeter', 'millimeters'];
const CM = ['centimetre', 'centimetres', 'centimeter', 'centimeters'];
const M = ['metre', 'metres', 'meter', 'meters'];
const INCH = ['"', 'inch', 'inches', 'ins'];
const FOOT = ["'", 'foot', 'feet'];

export const LENGTH_SMALL: readonly Unit[] = [
  own('mm', MM),
  metric('cm', 10, CM),
  metric('m', 1000, M),
  metric('µm', 0.001, ['micron', 'microns']),
  imperial('in', INCH_MM, INCH),
  imperial('ft', INCH_MM * 12, FOOT)
];

export const LENGTH_LARGE: readonly Unit[] = [
  own('m', M),
  metric('mm', 0.001, MM),
  metric('cm', 0.01, CM),
  imperial('ft', FOOT_M, FOOT),
  imperial('in', INCH_MM / 1000, INCH),
  imperial('yd', FOOT_M * 3, ['yard', 'yards'])
];

export const VOLUME: readonly Unit[] = [
  own('L', ['litre', 'litres', 'liter', 'liters', 'ltr', 'dm3']),
  metric('m³', 1000, ['cubic metre', 'cubic metres', 'cubic meters', 'cu m']),
  metric('cm³', 0.001, ['cc', 'ml', 'cubic centimetres', 'cubic centimeters']),
  imperial('cu ft', CUBIC_FOOT_L, ['ft3', 'cuft', 'cf', 'cubic foot', 'cubic feet']),
  imperial('cu in', CUBIC_INCH_L, ['in3', 'cubic inch', 'cubic inches']),
  imperial('US gal', CUBIC_INCH_L * 231, ['us gallon', 'us gallons']),
  imperial('imp gal', 4.54609, ['imperial gallon', 'imperial gallons', 'uk gal', 'uk gallons'])
];

export const AREA: readonly Unit[] = [
  own('cm²', ['sq cm', 'square centimetres', 'square centimeters']),
  metric('m²', 1e4, ['sq m', 'square metres', 'square meters']),
  metric('mm²', 0.01, ['sq mm', 'square millimetres', 'square millimeters']),
  imperial('sq in', (INCH_MM / 10) ** 2, ['in2', 'square inch', 'square inches']),
  imperial('sq ft', (FOOT_M * 100) ** 2, ['ft2', 'square foot', 'square feet'])
];

const GRAM = ['gram', 'grams', 'gramme', 'grammes', 'gr'];
const KILO = ['kilogram', 'kilograms', 'kilo', 'kilos', 'kgs'];
const OUNCE = ['ounce', 'ounces'];
const POUND = ['lbs', 'pound', 'pounds'];

export const MASS_SMALL: readonly Unit[] = [
  own('g', GRAM),
  metric('kg', 1000, KILO),
  metric('mg', 0.001, ['milligram', 'milligrams']),
  imperial('oz', (POUND_KG * 1000) / 16, OUNCE),
  imperial('lb', POUND_KG * 1000, POUND)
];

export const MASS_LARGE: readonly Unit[] = [
  own('kg', KILO),
  metric('g', 0.001, GRAM),
  imperial('lb', POUND_KG, POUND),
  imperial('oz', POUND_KG / 16, OUNCE)
];

/** Data sheets give these three in metric units everywhere: they have no imperial dress. */
export const COMPLIANCE: readonly Unit[] = [
  own('mm/N'),
  metric('m/N', 1000),
  metric('µm/N', 0.001),
  metric('cm/N', 10)
];
export const MECHANICAL_RESISTANCE: readonly Unit[] = [
  own('kg/s', ['Ns/m', 'N s/m', 'kg/sec', 'mechanical ohm', 'mechanical ohms']),
  metric('g/s', 0.001)
];
export const FORCE_FACTOR: readonly Unit[] = [
  own('T·m', ['Tm', 'T m', 'N/A', 'tesla metre', 'tesla metres', 'tesla meters', 'Wb/m'])
];
