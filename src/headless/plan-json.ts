import { celsius } from '../units/index.ts';
import type { Pascal } from '../units/index.ts';
import { loadCurves, modelName } from '../blending/index.ts';
import type { CylinderState, Job, LargestFill, Mixing, MixingSplit, Plan, PlanStep, StripPoint } from '../blending/index.ts';

const { lowestGasTemperature } = await loadCurves();

/** A plan as plain JSON, every number with its unit in its name. */
export function planJson(plan: Plan, recipeId: string): object {
  const { job, final } = plan;
  return {
    ok: true,
    recipeId,
    gases: job.gases,
    model: {
      equation: modelName(plan.job.gases), class: plan.modelClass, estimatedPairs: plan.estimatedPairs, cubicGases: plan.cubicGases,
      relativeStandardUncertainty: plan.modelUncertainty, gasConstant_J_per_molK: plan.gasConstant,
    },
    barometer_bar: job.conditions.barometer / 1e5,
    conditioning: plan.conditioned.map(({ step, cycles, pressure, oldGas, byRule, purgeGas }) => ({
      act: step + 1, cycles, ...pressureJson(job, pressure), oldGas_mol_per_mol: oldGas, oldGasByRule_mol_per_mol: byRule, purgeGas_mol: purgeGas,
    })),
    start: plan.start === null ? null : stateJson(job, plan.start),
    orderOfAddition: plan.sequence,
    steps: plan.steps.map((step) => stepJson(plan, step)),
    finished: stateJson(job, plan.finished),
    components: final.components.map((component) => ({
      gas: component.gas,
      nominal_mol_per_mol: component.nominal,
      planned_mol_per_mol: component.planned,
      byIdealStops_mol_per_mol: component.byIdealStops,
      massFraction_kg_per_kg: component.massFraction,
      volumeFraction_m3_per_m3: component.volumeFraction,
      massConcentration_mg_per_m3: component.massConcentration === null ? null : component.massConcentration * 1e6,
      partialPressure_bar: component.partialPressure / 1e5,
    })),
    concentrationState: {
      temperature_C: celsius(job.conditions.concentrationTemperature),
      pressure_bar_absolute: job.conditions.concentrationPressure / 1e5,
    },
    meanMolarMass_g_per_mol: final.meanMolarMass * 1e3,
    totalMass_g: final.totalMass * 1e3,
    // A blend that separates has no filling ratio as a gas.
    fillingRatio_kg_per_kg: plan.phase.finished.phase === 'unstable' ? null : final.fillingRatio,
    massDensity_kg_per_m3: final.massDensity,
    developedPressures: final.developedPressures.map((point) => pointJson(job, point)),
    releasedVolume_m3: final.releasedVolume,
    phase: phaseJson(plan),
    mixing: plan.mixing.ok ? mixingJson(job, plan.mixing.value) : { ok: false, reason: plan.mixing.reason },
    findings: plan.findings,
  };
}

function phaseJson(plan: Plan): object {
  const { job, phase } = plan;
  const lowest = lowestGasTemperature(plan);
  const { coldest } = phase;
  return {
    start: phase.start,
    steps: phase.steps,
    finished: phase.finished,
    lowestGasTemperature: lowest.ok
      ? { ok: true, value: lowest.value === null ? null : { ...pointJson(job, lowest.value), forming: lowest.value.forming } }
      : { ok: false, reason: lowest.reason },
    largestFill: coldest === null ? null : {
      coldest_C: celsius(coldest.temperature),
      ...(coldest.largestFill.ok ? { ok: true, value: largestFillJson(job, coldest.largestFill.value) } : { ok: false, reason: coldest.largestFill.reason }),
      searchedTo_bar_absolute: coldest.searchedTo / 1e5,
      slightlyColder: coldest.slightlyColder,
    },
  };
}

function largestFillJson(job: Job, largest: LargestFill | null): object | null {
  return largest === null ? null : {
    ...pressureJson(job, largest.pressure),
    dewPressure_bar_absolute: largest.dewPressure / 1e5,
    forming: largest.forming,
    mayFreeze: largest.mayFreeze,
  };
}

function stepJson({ job }: Plan, step: PlanStep): object {
  const gauge = job.gauges.find(({ key }) => key === step.gauge);
  return {
    number: step.number,
    parent: step.parent,
    parentName: job.parents.find(({ key }) => key === step.parent)?.name,
    shareOfParent_mol_per_mol: step.share,
    amount_mol: step.amount,
    mass_g: step.mass * 1e3,
    ...stateJson(job, step.state),
    rise_bar: step.rise / 1e5,
    gauge: gauge === undefined ? null : { key: gauge.key, name: gauge.name, unit: gauge.unit, reference: gauge.reference },
    idealStop_bar_absolute: step.idealStop === null ? null : step.idealStop / 1e5,
    strip: step.strip.map((point) => pointJson(job, point)),
    balance: {
      cumulativeMass_g: step.weighing.cumulativeMass * 1e3,
      readingGain_g: step.weighing.readingGain * 1e3,
      cumulativeGain_g: step.weighing.cumulativeGain * 1e3,
      reading_g: step.weighing.reading === null ? null : step.weighing.reading * 1e3,
    },
  };
}

function stateJson(job: Job, state: CylinderState): object {
  return {
    temperature_C: celsius(state.temperature),
    ...pressureJson(job, state.pressure),
    total_mol: state.total,
    volume_L: state.volume * 1e3,
    density_mol_per_L: state.density / 1e3,
    compressibilityFactor: state.compressibilityFactor,
    range: state.range,
    composition_mol_per_mol: Object.fromEntries(job.gases.map((gas, i) => [gas, state.fractions[i]])),
    partialPressures_bar: Object.fromEntries(job.gases.map((gas, i) => [gas, (state.fractions[i]! * state.pressure) / 1e5])),
  };
}

function pressureJson(job: Job, pressure: Pascal): object {
  return { pressure_bar_absolute: pressure / 1e5, pressure_bar_gauge: (pressure - job.conditions.barometer) / 1e5 };
}

function pointJson(job: Job, point: StripPoint): object {
  return { temperature_C: celsius(point.temperature), ...pressureJson(job, point.pressure) };
}

function mixingJson(job: Job, mixing: Mixing): object {
  return {
    ok: true,
    temperature_C: celsius(mixing.temperature),
    pressure_bar_absolute: mixing.pressure / 1e5,
    standardPressure_bar: mixing.standardPressure / 1e5,
    amount_mol: mixing.amount,
    gibbsEnergy_J: splitJson(mixing.gibbsEnergy, 1),
    gibbsEnergy_J_per_mol: splitJson(mixing.gibbsEnergy, mixing.amount),
    entropy_J_per_K: splitJson(mixing.entropy, 1),
    entropy_J_per_molK: splitJson(mixing.entropy, mixing.amount),
    enthalpy_J: mixing.enthalpy,
    enthalpy_J_per_mol: mixing.enthalpy / mixing.amount,
    chemicalPotentials: mixing.potentials.map(({ gas, relative, idealMixing, pressure, realGas }) => ({
      gas: job.gases[gas],
      relativeToStandardState_J_per_mol: relative,
      idealMixing_J_per_mol: idealMixing,
      pressure_J_per_mol: pressure,
      realGas_J_per_mol: realGas,
    })),
    sources: mixing.sources.map(({ parent, amount, pressure, assumed }) => ({
      parent: parent ?? 'residual', amount_mol: amount, pressure_bar_absolute: pressure / 1e5, pressureAssumed: assumed,
    })),
  };
}

function splitJson({ total, ideal, pressure, realGas }: MixingSplit, by: number): object {
  return { total: total / by, idealMixing: ideal / by, pressure: pressure / by, realGas: realGas / by };
}
