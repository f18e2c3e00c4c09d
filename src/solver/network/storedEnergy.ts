import { blockedDc } from "./blockedDc.ts";
import { dcSolution } from "./dcSolution.ts";
import type { LadderNetwork } from "./ladderNetwork.ts";
import { conductance } from "./lvSide.ts";

/**
 * Energy ½ C V² of every capacitor at steady dc: elements, strays, LV side, cable, instrument and the source's, and of a line's own
 * capacitance delay/impedance; the field of an inductance carrying current is not counted. null where some voltage does not exist.
 */
export function storedEnergy(network: LadderNetwork, voltage_V: number): number | null {
  const dc = dcSolution(network, voltage_V) ?? blockedDc(network, voltage_V);
  const { electrodeVoltage_V: electrode, tapVoltage_V: tap, outputVoltage_V: output } = dc;
  const across = dc.elementVoltage_V.filter((each) => each !== null);
  if (electrode === null || tap === null || output === null || across.length < network.n) return null;
  const { lv, protector, source, electrodeToTap_F } = network;
  return (
    stringEnergy(network, across, tap) +
    energy(electrodeToTap_F, electrode - tap) +
    energy(lv.capacitance_F + protector.capacitance_F, tap) +
    instrumentEnergy(network, tap, output) +
    energy(source.capacitance_F, electrode)
  );
}

const energy = (C: number, V: number): number => (C * V * V) / 2;

/** Voltages to earth summed from the tap, to the electrode from the top, so that neither cancels. */
function stringEnergy(network: LadderNetwork, across: readonly number[], tap: number): number {
  const { n, capacitance_F, toEarth_F, toElectrode_F } = network;
  let sum = across.reduce((total, V, i) => total + energy(capacitance_F[i]!, V), 0);
  let node = tap;
  let below = 0;
  for (let i = 0; i < n - 1; i++) {
    node += across[i]!;
    below += across[n - 1 - i]!;
    sum += energy(toEarth_F[i]!, node) + energy(toElectrode_F[n - 2 - i]!, below);
  }
  return sum;
}

/** From the instrument back to the tap; the current grows at every leakage. */
function instrumentEnergy(network: LadderNetwork, tap: number, output: number): number {
  const { instrument, seriesProtector, cable } = network;
  const { line } = cable;
  const Rs = seriesProtector.resistance_ohm;
  const atDivider = seriesProtector.at === "divider";
  let I = output * (conductance(instrument.resistance_ohm) + conductance(instrument.protector.resistance_ohm));
  let V = output + (atDivider ? 0 : Rs * I);
  let sum = energy(instrument.capacitance_F + instrument.protector.capacitance_F, output);
  if (line !== null) {
    sum += energy(line.delay_s / line.impedance_ohm, V);
    I += V * conductance(line.terminationAtEnd_ohm);
    V += line.seriesAtTap_ohm * I;
  }
  return sum + energy(cable.capacitance_F, atDivider ? V : tap);
}
