/**
 * Vapour pressures and dew points, by equal pressure and equal Gibbs energy. For
 * the gases of GERG-2008 computed with that model and 50 digits, for the others
 * with CoolProp 8.0 and the gas's reference equation.
 */
export interface SaturationRow {
  readonly gas: string;
  /** Gas constant of the equation, J/(mol K): a vapour pressure is proportional to it. */
  readonly gasConstant: number;
  readonly code: 'GERG-2008' | 'CoolProp';
  /** [T/K, p/kPa]. */
  readonly points: readonly (readonly [number, number])[];
}

export const saturationRows: readonly SaturationRow[] = [
  { gas: 'carbon dioxide', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 1969.62926314], [273.15, 3485.01391774], [293.15, 5728.251226885]] },
  { gas: 'propane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 244.1735061239], [273.15, 473.9369935223], [293.15, 835.7379344345]] },
  { gas: 'n-butane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 45.22734233615], [273.15, 103.3708888494], [293.15, 208.0826731543]] },
  { gas: 'isobutane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 72.41526114252], [273.15, 156.8683852222], [293.15, 302.1780594093]] },
  { gas: 'sulfur dioxide', gasConstant: 8.3144621, code: 'CoolProp', points: [[253.15, 63.52074543528], [273.15, 155.4920852976], [293.15, 330.6744313951]] },
  { gas: 'ammonia', gasConstant: 8.3144598, code: 'CoolProp', points: [[253.15, 190.0261001212], [273.15, 429.2477987205], [293.15, 857.039770696]] },
  { gas: 'nitrous oxide', gasConstant: 8.314472, code: 'CoolProp', points: [[253.15, 1797.108461461], [273.15, 3122.081522928], [293.15, 5052.509283082]] },
  { gas: 'hydrogen sulfide', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 546.3711678462], [273.15, 1032.44425229], [293.15, 1780.997639476]] },
  { gas: 'ethane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 1421.421494965], [273.15, 2386.674399536], [293.15, 3765.071297825]] },
  { gas: 'sulfur hexafluoride', gasConstant: 8.314472, code: 'CoolProp', points: [[253.15, 689.4072205673], [273.15, 1251.689073845], [293.15, 2097.74525352]] },
  { gas: 'xenon', gasConstant: 8.314472, code: 'CoolProp', points: [[253.15, 2618.32579766], [273.15, 4135.853007731]] },
  { gas: 'ethylene', gasConstant: 8.31451, code: 'CoolProp', points: [[253.15, 2528.429522885], [273.15, 4099.016758347]] },
  { gas: 'chlorine', gasConstant: 8.3144598, code: 'CoolProp', points: [[253.15, 180.3782127379], [273.15, 368.1133794985], [293.15, 675.6968069172]] },
  { gas: 'r134a', gasConstant: 8.314471, code: 'CoolProp', points: [[253.15, 132.7349794948], [273.15, 292.8031823395], [293.15, 571.7069090445]] },
  { gas: 'isobutene', gasConstant: 8.314472, code: 'CoolProp', points: [[253.15, 59.11516353599], [273.15, 132.2248112037], [293.15, 261.3343252582]] },
  { gas: 'n-pentane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 9.02821662194], [273.15, 24.44817365759], [293.15, 56.55821734644]] },
  { gas: 'n-hexane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 1.885531885867], [273.15, 6.065222146135], [293.15, 16.18644599341]] },
  { gas: 'isopentane', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 13.41778119175], [273.15, 34.54299393709], [293.15, 76.66463318308]] },
  { gas: 'propylene', gasConstant: 8.314472, code: 'CoolProp', points: [[253.15, 305.6216039876], [273.15, 584.0905473661], [293.15, 1017.02438307]] },
  { gas: 'carbonyl sulfide', gasConstant: 8.314472, code: 'CoolProp', points: [[253.15, 341.205953018], [273.15, 650.2950219763], [293.15, 1129.601853483]] },
  { gas: 'hydrogen chloride', gasConstant: 8.3144598, code: 'CoolProp', points: [[253.15, 1477.144241885], [273.15, 2589.291183662], [293.15, 4227.255044906]] },
  { gas: 'water', gasConstant: 8.314472, code: 'GERG-2008', points: [[253.15, 0.1249469869659], [273.15, 0.6136347449355], [293.15, 2.350941888346]] },
];

/** A dew point of a mixture, GERG-2008: pressure at T, or the highest temperature at p. */
export interface DewRow {
  readonly name: string;
  readonly composition: Readonly<Record<string, number>>;
  readonly given: 'T_K' | 'p_kPa';
  readonly at: number;
  readonly published: number;
}

export const dewRows: readonly DewRow[] = [
  { name: '10 % C3H8 in N2', composition: { propane: 0.1, nitrogen: 0.9 }, given: 'T_K', at: 253.15, published: 3745.809094601 },
  { name: '10 % C3H8 in N2', composition: { propane: 0.1, nitrogen: 0.9 }, given: 'p_kPa', at: 1000, published: 227.6106236462 },
  { name: '10 % C3H8 in N2', composition: { propane: 0.1, nitrogen: 0.9 }, given: 'p_kPa', at: 2000, published: 241.2709373064 },
  { name: '10 % C3H8 in N2', composition: { propane: 0.1, nitrogen: 0.9 }, given: 'p_kPa', at: 5000, published: 257.8063574239 },
  { name: '2 % n-C4H10 in CH4', composition: { 'n-butane': 0.02, methane: 0.98 }, given: 'T_K', at: 243.15, published: 2074.299343938 },
  { name: '2 % n-C4H10 in CH4', composition: { 'n-butane': 0.02, methane: 0.98 }, given: 'p_kPa', at: 1000, published: 232.7728397938 },
  { name: '2 % n-C4H10 in CH4', composition: { 'n-butane': 0.02, methane: 0.98 }, given: 'p_kPa', at: 3000, published: 247.2743465956 },
  { name: '2 % n-C4H10 in CH4', composition: { 'n-butane': 0.02, methane: 0.98 }, given: 'p_kPa', at: 6000, published: 247.1594400894 },
  { name: '0.5 % n-C6H14 in N2', composition: { 'n-hexane': 0.005, nitrogen: 0.995 }, given: 'T_K', at: 253.15, published: 410.515198165 },
  { name: '0.5 % n-C6H14 in N2', composition: { 'n-hexane': 0.005, nitrogen: 0.995 }, given: 'T_K', at: 273.15, published: 1588.242049597 },
  { name: '0.5 % n-C6H14 in N2', composition: { 'n-hexane': 0.005, nitrogen: 0.995 }, given: 'p_kPa', at: 1000, published: 266.3398271639 },
  { name: '0.5 % n-C6H14 in N2', composition: { 'n-hexane': 0.005, nitrogen: 0.995 }, given: 'p_kPa', at: 3000, published: 281.6588977656 },
  { name: '0.5 % n-C6H14 in N2', composition: { 'n-hexane': 0.005, nitrogen: 0.995 }, given: 'p_kPa', at: 5000, published: 286.6234713075 },
  { name: '50 % CO2 in Ar', composition: { 'carbon dioxide': 0.5, argon: 0.5 }, given: 'T_K', at: 233.15, published: 2234.105307084 },
  { name: '50 % CO2 in Ar', composition: { 'carbon dioxide': 0.5, argon: 0.5 }, given: 'T_K', at: 243.15, published: 3314.579485803 },
  { name: '50 % CO2 in Ar', composition: { 'carbon dioxide': 0.5, argon: 0.5 }, given: 'T_K', at: 253.15, published: 4873.800506822 },
  { name: '50 % CO2 in Ar', composition: { 'carbon dioxide': 0.5, argon: 0.5 }, given: 'p_kPa', at: 3000, published: 240.5830510869 },
  { name: '50 % CO2 in Ar', composition: { 'carbon dioxide': 0.5, argon: 0.5 }, given: 'p_kPa', at: 5000, published: 253.8067955931 },
  { name: '10 % H2S in CH4', composition: { 'hydrogen sulfide': 0.1, methane: 0.9 }, given: 'T_K', at: 233.15, published: 3949.431347708 },
  { name: '10 % H2S in CH4', composition: { 'hydrogen sulfide': 0.1, methane: 0.9 }, given: 'p_kPa', at: 2000, published: 222.209266952 },
  { name: '10 % H2S in CH4', composition: { 'hydrogen sulfide': 0.1, methane: 0.9 }, given: 'p_kPa', at: 5000, published: 235.8235734734 },
  { name: '1 % n-C4H10 in air (N2/O2/Ar)', composition: { 'n-butane': 0.01, nitrogen: 0.773388, oxygen: 0.207504, argon: 0.009108 }, given: 'p_kPa', at: 1000, published: 220.7421707487 },
  { name: '1 % n-C4H10 in air (N2/O2/Ar)', composition: { 'n-butane': 0.01, nitrogen: 0.773388, oxygen: 0.207504, argon: 0.009108 }, given: 'p_kPa', at: 4000, published: 236.447870391 },
  { name: '30 % C2H6 in N2', composition: { ethane: 0.3, nitrogen: 0.7 }, given: 'T_K', at: 213.15, published: 1487.27714292 },
  { name: '30 % C2H6 in N2', composition: { ethane: 0.3, nitrogen: 0.7 }, given: 'T_K', at: 223.15, published: 2327.754519355 },
  { name: '30 % C2H6 in N2', composition: { ethane: 0.3, nitrogen: 0.7 }, given: 'T_K', at: 233.15, published: 3671.104171611 },
  { name: '30 % C2H6 in N2', composition: { ethane: 0.3, nitrogen: 0.7 }, given: 'p_kPa', at: 2000, published: 219.7439004127 },
  { name: '30 % C2H6 in N2', composition: { ethane: 0.3, nitrogen: 0.7 }, given: 'p_kPa', at: 4000, published: 234.9245347557 },
  { name: '20 % C3H8 in He', composition: { propane: 0.2, helium: 0.8 }, given: 'T_K', at: 253.15, published: 1193.871372923 },
  { name: '20 % C3H8 in He', composition: { propane: 0.2, helium: 0.8 }, given: 'T_K', at: 273.15, published: 2298.573204205 },
  { name: '20 % C3H8 in He', composition: { propane: 0.2, helium: 0.8 }, given: 'T_K', at: 293.15, published: 4021.931462575 },
  { name: '20 % C3H8 in He', composition: { propane: 0.2, helium: 0.8 }, given: 'p_kPa', at: 1000, published: 248.2819485308 },
  { name: '20 % C3H8 in He', composition: { propane: 0.2, helium: 0.8 }, given: 'p_kPa', at: 3000, published: 282.3019381693 },
];
