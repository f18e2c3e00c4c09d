/** The usual cautions. They stand where the danger is, print with it, and defer to local codes and licensed practice. */
export interface Caution {
  readonly id: string;
  readonly text: string;
  /** Screens on which it stands. */
  readonly where: readonly ("prove" | "build" | "calibrate" | "use")[];
}

const everywhere = ["prove", "build", "calibrate", "use"] as const;

export const cautions: readonly Caution[] = [
  {
    id: "qualified",
    text: "High voltage can kill. Work by qualified persons, not alone, under local codes and licensed practice.",
    where: everywhere,
  },
  {
    id: "sourceOff",
    text:
      "Place and connect the divider with the source off, discharged and earthed. " +
      "Do not hold or touch it while the source can be on.",
    where: everywhere,
  },
  {
    id: "earthFirst",
    text:
      "Earth first: divider base and instrument, by two independent bonds. " +
      "Never lift an instrument's protective earth.",
    where: everywhere,
  },
  {
    id: "zeroReading",
    text: "A zero reading does not mean that the voltage is off.",
    where: everywhere,
  },
  {
    id: "discharge",
    text:
      "After switching off wait, discharge with an earthing stick, verify, and leave earthed: " +
      "charge comes back by dielectric absorption. The wait time is never permission to touch.",
    where: everywhere,
  },
  {
    id: "notADetector",
    text: "This divider is not a voltage detector: proving absence of voltage is not a use of it.",
    where: everywhere,
  },
  {
    id: "limitsOnly",
    text: "The findings say which limits were met, each with its source. They are no approval of the divider.",
    where: ["prove", "build"],
  },
];
