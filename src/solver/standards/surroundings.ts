/** Kinds that the insulation tables are entered with (IEC 60664-1). */
export type PollutionDegree = 1 | 2 | 3;
export type MaterialGroup = "I" | "II" | "IIIa" | "IIIb";
