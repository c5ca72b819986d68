/**
 * Reducing parameters of pairs outside GERG-2008, fitted with F = 0 and
 * betaV = gammaV = 1.
 *
 * Source: I. H. Bell, E. W. Lemmon, Automatic Fitting of Binary Interaction
 * Parameters, J. Chem. Eng. Data 61 (2016) 3752 (volume and page from memory);
 * `bell2025` rows: I. H. Bell (2025), both as in CoolProp. The data were mostly of
 * vapour and liquid in equilibrium: the pairs suit phase boundaries better than
 * the density of a gas, and were fitted with the long equations of the gases
 * that GERG-2008 has in a short form.
 */
import type { GasId } from '../gases.ts';

/** By the first gas: [second gas, betaT, gammaT]; betaT belongs to the first. */
export const bell2016: readonly (readonly [first: GasId, rows: readonly (readonly [second: GasId, betaT: number, gammaT: number])[]])[] = [
  ['1-butene', [
    ['acetone', 1.01475, 0.95623], ['n-butane', 1.00154, 0.99777], ['carbon dioxide', 0.98059, 0.96751],
    ['ethylene', 1.00327, 1.0557], ['propylene', 1.00018, 1.00725],
  ]],
  ['acetone', [
    ['benzene', 0.9982, 0.98198], ['n-butane', 0.98364, 0.93303], ['carbon dioxide', 1.01322, 1.0805],
    ['n-decane', 1.02395, 0.96708], ['ethane', 0.96779, 1.0142], ['ethanol', 1.0035, 0.9739], ['ethylene', 0.99223, 1.10077],
    ['hydrogen sulfide', 0.95958, 1.04871], ['n-heptane', 1.01173, 0.92544], ['n-hexane', 1.00129, 0.91955],
    ['isobutene', 0.98616, 0.95994], ['isobutane', 0.98302, 0.93551], ['methanol', 0.99906, 0.97135],
    ['n-nonane', 1.01457, 0.9428], ['n-pentane', 0.9945, 0.92363], ['propylene', 0.98047, 0.99014],
    ['sulfur dioxide', 1.0107, 1.10455], ['toluene', 0.99846, 0.97643], ['water', 0.98238, 0.9197],
  ]],
  ['ammonia', [
    ['argon', 1.03498, 1.06504], ['benzene', 1.03065, 0.92822], ['n-butane', 1.05871, 0.80552], ['n-hexane', 1.09995, 0.86636],
    ['krypton', 0.98832, 0.92419], ['n-octane', 1.04331, 0.62644], ['n-pentane', 1.09752, 0.8445], ['propane', 1.04145, 0.79017],
    ['propylene', 1.02533, 0.84826],
  ]],
  ['argon', [['benzene', 1.00291, 1.40461], ['krypton', 1.0002, 1.0046], ['neopentane', 1.00019, 1.28707]]],
  ['benzene', [
    ['n-butane', 0.99022, 0.99834], ['carbon monoxide', 1.02875, 1.47254], ['carbon dioxide', 0.99261, 1.03295],
    ['n-decane', 1.00678, 0.99831], ['ethane', 0.99662, 1.08163], ['ethanol', 1.02907, 0.9164],
    ['hydrogen sulfide', 1.00564, 1.06015], ['n-heptane', 1.00775, 0.97482], ['n-hexane', 1.0043, 0.97222],
    ['methane', 1.0018, 1.29314], ['methanol', 1.02351, 0.90254], ['n-nonane', 1.00489, 0.97411], ['n-octane', 1.00796, 0.98037],
    ['n-pentane', 1.00187, 0.97605], ['propane', 1.0017, 1.01942], ['propylene', 0.9973, 1.02876], ['toluene', 1.00015, 1.00176],
  ]],
  ['n-butane', [
    ['ethylene', 1.02263, 1.05892], ['hydrogen chloride', 0.97018, 0.94381], ['isobutene', 1.00062, 0.99703],
    ['r134a', 1.00409, 0.89057], ['trifluoromethane', 0.97624, 0.89836],
  ]],
  ['chlorine', [['hydrogen chloride', 0.99601, 0.96115]]],
  ['carbon monoxide', [['ethanol', 0.91325, 1.69985], ['ethylene', 0.96489, 1.09111]]],
  ['carbon dioxide', [
    ['carbonyl sulfide', 1.00023, 0.9445], ['ethylene', 1.00402, 0.95576], ['neopentane', 1.02674, 0.9543],
    ['propylene', 1.01217, 0.93465], ['r134a', 1.01036, 1.01129], ['trifluoromethane', 1.00402, 0.9847],
    ['sulfur dioxide', 1.00511, 1.0107], ['toluene', 1.00502, 1.06677],
  ]],
  ['carbonyl sulfide', [['hydrogen sulfide', 0.99425, 0.94407], ['methane', 1.01619, 1.08482], ['propane', 0.99601, 0.992]]],
  ['deuterium', [['hydrogen', 0.99136, 0.99511], ['neon', 0.98882, 0.83393], ['nitrogen', 1.01561, 1.22898]]],
  ['n-decane', [
    ['ethanol', 0.99423, 0.89711], ['ethylene', 1.05317, 1.28576], ['propylene', 1.04471, 1.19102], ['toluene', 0.9929, 0.99245],
  ]],
  ['ethane', [
    ['ethylene', 1.00375, 0.99401], ['hydrogen chloride', 0.99182, 0.90586], ['krypton', 1.00338, 1.04799],
    ['propylene', 0.99928, 1.0056], ['tetrafluoromethane', 1.01483, 0.89216], ['trifluoromethane', 1.00597, 0.87082],
    ['toluene', 0.9954, 1.12756], ['xenon', 0.99857, 1.0096],
  ]],
  ['ethanol', [
    ['ethylene', 1.02189, 1.17065], ['n-heptane', 0.98096, 0.8981], ['n-hexane', 0.97333, 0.90746],
    ['isobutene', 0.97566, 0.96241], ['methanol', 1.00177, 0.99902], ['nitrogen', 1.04316, 1.63914],
    ['n-nonane', 1.00808, 0.89624], ['n-octane', 0.99103, 0.89471], ['r134a', 0.97178, 0.98183],
    ['trifluoromethane', 0.90517, 1.05138], ['toluene', 0.981, 0.90682],
  ]],
  ['ethylene', [
    ['n-heptane', 0.97975, 1.1797], ['n-hexane', 0.99131, 1.13008], ['isobutane', 0.99619, 1.05868],
    ['methane', 0.99352, 1.02333], ['nitrogen', 0.99699, 1.051], ['n-nonane', 0.96742, 1.26048], ['n-octane', 0.9692, 1.21808],
    ['propane', 1.00374, 1.01236], ['propylene', 1.00207, 1.01552], ['xenon', 0.99831, 0.98039],
  ]],
  ['hydrogen sulfide', [['neopentane', 1.02548, 0.93089], ['toluene', 0.98283, 1.08325]]],
  ['hydrogen chloride', [
    ['n-hexane', 1.01481, 1.01449], ['methanol', 0.90069, 1.65053], ['propane', 1.02143, 0.9176],
    ['sulfur dioxide', 0.9942, 1.05144], ['xenon', 0.98264, 0.90579],
  ]],
  ['n-heptane', [['propylene', 0.99114, 1.06264], ['toluene', 0.99684, 0.98136]]],
  ['n-hexane', [['propylene', 1.01641, 1.03815], ['toluene', 0.99876, 0.98316], ['xenon', 1.01959, 1.16656]]],
  ['hydrogen', [['neon', 1.00124, 0.83639]]],
  ['isobutene', [
    ['isobutane', 1.00019, 0.99644], ['n-octane', 0.99296, 1.0535], ['propane', 1.00734, 0.99305],
    ['sulfur dioxide', 0.9864, 0.94224],
  ]],
  ['isopentane', [['trifluoromethane', 0.97157, 0.93001], ['toluene', 1.01022, 0.99749]]],
  ['isobutane', [
    ['propylene', 1.03014, 1.0126], ['r134a', 1.00145, 0.89668], ['trifluoromethane', 0.97853, 0.89794],
  ]],
  ['krypton', [['methane', 0.99962, 0.99368], ['oxygen', 0.99555, 0.98848], ['propylene', 0.99711, 1.08746]]],
  ['methane', [
    ['nitrous oxide', 0.98876, 1.02354], ['neopentane', 0.98554, 1.22513], ['propylene', 0.99563, 1.11748],
    ['sulfur dioxide', 1.03694, 1.07082],
  ]],
  ['methanol', [
    ['oxygen', 1.07547, 1.5018], ['r134a', 1.00779, 0.98889], ['sulfur dioxide', 0.97373, 1.02388], ['toluene', 0.98203, 0.891],
    ['water', 0.99676, 0.96774], ['xenon', 0.93558, 0.77335],
  ]],
  ['neopentane', [['n-pentane', 1.0005, 1.00236], ['propane', 1.02028, 1.0591]]],
  ['nitrogen', [['tetrafluoromethane', 0.97005, 1.10991]]],
  ['n-nonane', [['propylene', 1.01604, 1.11698], ['toluene', 0.99448, 0.98072]]],
  ['n-octane', [['toluene', 0.99664, 0.98036]]],
  ['oxygen', [['sulfur dioxide', 0.98436, 1.18081]]],
  ['n-pentane', [
    ['trifluoromethane', 0.96622, 0.94007], ['sulfur hexafluoride', 0.97466, 0.92912], ['toluene', 1.00052, 0.99282],
  ]],
  ['propane', [
    ['propylene', 0.99978, 0.9935], ['r134a', 1.01148, 0.89674], ['trifluoromethane', 0.98814, 0.87585],
    ['sulfur dioxide', 0.99024, 0.87281], ['toluene', 1.00576, 1.04281], ['xenon', 1.00491, 1.04133],
  ]],
  ['propylene', [['r134a', 1.0136, 0.93494], ['trifluoromethane', 0.99184, 0.9181], ['xenon', 0.99031, 1.01223]]],
  ['r134a', [['trifluoromethane', 1.00246, 1.0219]]],
  ['tetrafluoromethane', [['trifluoromethane', 1.01673, 0.94295], ['toluene', 0.92032, 1.18828]]],
  ['trifluoromethane', [['sulfur hexafluoride', 0.99445, 0.91843], ['toluene', 0.96909, 1.07054]]],
  ['sulfur hexafluoride', [['xenon', 0.96469, 0.92846]]],
  ['sulfur dioxide', [['toluene', 1.01133, 1.02114]]],
];

export const bell2025: typeof bell2016 = [
  ['propane', [['tetrafluoromethane', 1, 0.919519]]],
  ['ammonia', [['r134a', 1, 0.912635]]],
];
