import type { LadderNetwork } from "./ladderNetwork.ts";
import { conductance } from "./lvSide.ts";

/**
 * The network with its line as what it is to anything slow against its delay: its capacitance delay/impedance, with its resistors in
 * place; terminated, the resistor alone, since its inductance makes up for its capacitance. The same at dc. A resistor at the tap beside a series protector at the instrument: both stand at the tap.
 */
export function lumpedCable(network: LadderNetwork): LadderNetwork {
  const { cable, instrument, protector, seriesProtector } = network;
  const { line } = cable;
  if (line === null) return network;
  const atTap = line.seriesAtTap_ohm > 0 || seriesProtector.at === "divider";
  const termination = conductance(line.terminationAtEnd_ohm);
  const beside = (R: number) => 1 / (conductance(R) + termination);
  const before = seriesProtector.at === "instrument" && seriesProtector.resistance_ohm > 0 && !atTap;
  const end = before
    ? instrument.protector
    : { ...instrument.protector, resistance_ohm: beside(instrument.protector.resistance_ohm) };
  return {
    ...network,
    cable: {
      capacitance_F: cable.capacitance_F + (termination > 0 ? 0 : line.delay_s / line.impedance_ohm),
      line: null,
    },
    protector: before ? { ...protector, resistance_ohm: beside(protector.resistance_ohm) } : protector,
    instrument: { ...instrument, protector: end },
    seriesProtector: {
      resistance_ohm: seriesProtector.resistance_ohm + line.seriesAtTap_ohm,
      at: atTap ? "divider" : "instrument",
    },
  };
}
