import { type Rational, ONE, ZERO, rationalFromText } from '../exact/rational.ts';
import {
  type Dimension,
  AMOUNT,
  AREA,
  CHARGE,
  CURRENT,
  CURRENT_DENSITY,
  ENERGY,
  LENGTH,
  MASS,
  MOLAR_CONCENTRATION,
  NUMBER,
  POWER,
  PRESSURE,
  TEMPERATURE,
  TIME,
  VOLTAGE,
  VOLUME,
} from './dimension.ts';

/** A unit by name: a value in it times `factor`, plus `offset`, is the value in SI base units. */
export interface Unit {
  readonly dimension: Dimension;
  readonly factor: Rational;
  /** Of a temperature scale, in kelvins; 0 elsewhere. */
  readonly offset: Rational;
  /** True where SI prefixes may stand before it. */
  readonly prefixed: boolean;
}

/** Exact product or quotient of decimal texts: "1.5*2/3", read from the left. */
const exactly = (text: string): Rational =>
  text.split('*').reduce((product, part) => {
    const [first = '1', ...divisors] = part.split('/');
    return divisors.reduce((left, right) => left.div(rationalFromText(right)), product.mul(rationalFromText(first)));
  }, ONE);

/**
 * Units by dimension: names separated by blanks, a colon, the exact factor to SI base units; `~` marks names that
 * take SI prefixes. Sources: SI Brochure (9th ed., 2019) for SI and accepted units, with e, N_A and k exact; NIST
 * SP 811 (2008) app. B for the yard and pound of 1959 (0.9144 m, 0.45359237 kg), the troy ounce (31.1034768 g), the US
 * gallon (231 cubic inches), the conventional millimetre of mercury (13.5951 x 9.80665 Pa) and the inch of mercury; the
 * imperial gallon (4.54609 L) is that of the UK Units of Measurement Regulations 1995. A normal cubic metre is the
 * amount of an ideal gas in 1 m^3 at 0 °C and 101.325 kPa (DIN 1343); `Sm3` at 15 °C and 101.325 kPa (ISO 13443).
 */
const TABLE: readonly (readonly [Dimension, string])[] = [
  [NUMBER, `1:1; % percent pct:1/100; ‰ permille:1/1000; ppm:1/1000000; ppb:1/1000000000; pp:1/100`],
  [
    LENGTH,
    `~m:1; metre metres meter meters:1; micron microns:0.000001; mil mils thou:0.0000254; µin uin:0.0000000254;
    in inch inches:0.0254; ft foot feet:0.3048; yd yard yards:0.9144; Å angstrom:0.0000000001`,
  ],
  [AREA, `sqft sq_ft:0.3048*0.3048; sqin sq_in:0.0254*0.0254; ha:10000`],
  [
    VOLUME,
    `~L ~l:0.001; litre litres liter liters:0.001; cc:0.000001; gal_us:0.003785411784; gal_imp gal_uk:0.00454609;
    qt_us:0.000946352946; qt_imp:0.0011365225; pt_us:0.000473176473; pt_imp:0.00056826125;
    fl_oz_us:0.0000295735295625; fl_oz_imp:0.0000284130625; cuft cu_ft:0.3048*0.3048*0.3048`,
  ],
  [
    MASS,
    `~g:0.001; gram grams gramme grammes:0.001; kilogram kilograms kilo kilos:1; ~t:1000; tonne tonnes:1000;
    lb lbs lb_av pound pounds:0.45359237; lb_t:0.3732417216; oz_av:0.028349523125; oz_t ozt:0.0311034768;
    grain grains:0.00006479891; dwt:0.00155517384; ton_short ton_us:907.18474; ton_long ton_imp:1016.0469088;
    ct carat:0.0002`,
  ],
  [
    TIME,
    `~s:1; sec secs second seconds:1; min mins minute minutes:60; h hr hrs hour hours:3600; d day days:86400;
    wk week weeks:604800`,
  ],
  [CURRENT, `~A:1; amp amps ampere amperes:1`],
  [CURRENT_DENSITY, `ASD:100; ASF:1/0.3048/0.3048`],
  [
    CHARGE,
    `~C:1; coulomb coulombs:1; Ah:3600; mAh:3.6; kAh:3600000; µAh uAh:0.0036; MAh:3600000000; amp-hour amp-hours:3600;
    F faraday faradays:96485.3321233100184`,
  ],
  [VOLTAGE, `~V:1; volt volts:1`],
  [POWER, `~W:1; watt watts:1; ~VA:1; hp_mech:550*0.3048*0.45359237*9.80665; hp_metric:75*9.80665`],
  [
    ENERGY,
    `~J:1; joule joules:1; Wh:3600; mWh:3.6; kWh:3600000; MWh:3600000000; GWh:3600000000000; ~eV:0.0000000000000000001602176634;
    cal_th:4.184; kcal_th:4184; cal_it:4.1868; kcal_it:4186.8`,
  ],
  [
    PRESSURE,
    `~Pa:1; pascal pascals:1; ~bar:100000; atm:101325; torr Torr:101325/760; mTorr:101.325/760; mmHg mm_Hg:133.322387415;
    inHg:3386.388640341; psi psia:0.45359237*9.80665/0.0254/0.0254; at:98066.5; mmH2O:9.80665; cmH2O:98.0665;
    inH2O:249.08891`,
  ],
  [
    AMOUNT,
    `~mol:1; mole moles:1; lbmol:453.59237; Nm3 Nm^3 Nm³ m3N m3n m3(N) m³(N) m^3(N):101325/8.31446261815324/273.15;
    NL Nl Ndm3:101.325/8.31446261815324/273.15; NmL Nml Ncm3 scc:0.101325/8.31446261815324/273.15;
    Sm3 Sm^3 Sm³:101325/8.31446261815324/288.15`,
  ],
  [MOLAR_CONCENTRATION, `~M:1000; molar:1000`],
  [TEMPERATURE, `~K:1; kelvin kelvins:1; Ra degR °R:5/9`],
];

const plainUnits = TABLE.flatMap(([dimension, entries]) =>
  entries.split(';').flatMap((entry) => {
    const [names = '', factor = '1'] = entry.trim().split(':');
    return names.split(' ').map((name): readonly [string, Unit] => {
      const bare = name.startsWith('~') ? name.slice(1) : name;
      return [bare, { dimension, factor: exactly(factor), offset: ZERO, prefixed: bare !== name }];
    });
  }),
);

const scale = (names: string, factor: string, offset: string): readonly (readonly [string, Unit])[] =>
  names
    .split(' ')
    .map((name) => [
      name,
      { dimension: TEMPERATURE, factor: exactly(factor), offset: exactly(offset), prefixed: false },
    ]);

const UNITS: ReadonlyMap<string, Unit> = new Map([
  ...plainUnits,
  ...scale('°C degC ℃ celsius Celsius', '1', '273.15'),
  ...scale('°F degF ℉ fahrenheit Fahrenheit', '5/9', '459.67*5/9'),
]);

/** SI prefixes as decimal factors, longest spelling first (SI Brochure, table 7). */
const PREFIXES: readonly (readonly [string, string])[] = [
  ['da', '10'],
  ['µ', '0.000001'],
  ['μ', '0.000001'],
  ['u', '0.000001'],
  ['G', '1000000000'],
  ['M', '1000000'],
  ['k', '1000'],
  ['h', '100'],
  ['d', '0.1'],
  ['c', '0.01'],
  ['m', '0.001'],
  ['n', '0.000000001'],
  ['p', '0.000000000001'],
];

/** Names that stand for more than one unit of the trade, with the spellings that say which. */
export const AMBIGUOUS_UNITS: ReadonlyMap<string, string> = new Map([
  ['oz', 'oz_av (28.349523125 g) or oz_t, the troy ounce (31.1034768 g)'],
  ['ounce', 'oz_av (28.349523125 g) or oz_t, the troy ounce (31.1034768 g)'],
  ['ounces', 'oz_av (28.349523125 g) or oz_t, the troy ounce (31.1034768 g)'],
  ['gal', 'gal_us (3.785411784 L) or gal_imp (4.54609 L)'],
  ['gallon', 'gal_us (3.785411784 L) or gal_imp (4.54609 L)'],
  ['gallons', 'gal_us (3.785411784 L) or gal_imp (4.54609 L)'],
  ['qt', 'qt_us (0.946352946 L) or qt_imp (1.1365225 L)'],
  ['quart', 'qt_us (0.946352946 L) or qt_imp (1.1365225 L)'],
  ['pt', 'pt_us (0.473176473 L) or pt_imp (0.56826125 L)'],
  ['pint', 'pt_us (0.473176473 L) or pt_imp (0.56826125 L)'],
  ['fl_oz', 'fl_oz_us (29.5735295625 mL) or fl_oz_imp (28.4130625 mL)'],
  ['floz', 'fl_oz_us (29.5735295625 mL) or fl_oz_imp (28.4130625 mL)'],
  ['ton', 't (1000 kg), ton_short (907.18474 kg) or ton_long (1016.0469088 kg)'],
  ['tons', 't (1000 kg), ton_short (907.18474 kg) or ton_long (1016.0469088 kg)'],
  ['gr', 'g (gram) or grain (64.79891 mg)'],
  ['cal', 'cal_th (4.184 J) or cal_it (4.1868 J)'],
  ['kcal', 'kcal_th (4184 J) or kcal_it (4186.8 J)'],
  ['hp', 'hp_mech (550 ft lbf/s) or hp_metric (75 kgf m/s)'],
  ['N', 'mol/L of the species; a normality depends on the reaction'],
  ['deg', '°C, °F or K'],
  ['°', '°C, °F or K'],
]);

const withPrefix = (name: string): Unit | undefined => {
  for (const [prefix, factor] of PREFIXES) {
    if (!name.startsWith(prefix)) continue;
    const unit = UNITS.get(name.slice(prefix.length));
    if (unit?.prefixed === true) return { ...unit, factor: unit.factor.mul(rationalFromText(factor)) };
  }
  return undefined;
};

/** The unit of this name, SI prefixes included; undefined where there is none or more than one. */
export const unitNamed = (name: string): Unit | undefined =>
  AMBIGUOUS_UNITS.has(name) ? undefined : (UNITS.get(name) ?? withPrefix(name));

/** All names without a prefix, and the usual prefixed ones: what a did-you-mean may propose. */
export const UNIT_NAMES: readonly string[] = [
  ...[...UNITS.keys()].filter((name) => name !== '1'),
  ...'mA kA kg mg µg mL µm mm cm dm kPa MPa mbar hPa mmol µmol kmol mV kV kW MW kJ MJ'.split(' '),
];
