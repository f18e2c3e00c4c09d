import { answerField } from "../../solver/index.ts";
import { readArguments } from "../arguments.ts";
import { readText, refusalText } from "../openDocument.ts";
import { Unusable, type Verb } from "../verb.ts";

export const field: Verb = {
  name: "field",
  does: "the strays and fields of a drawn column, as numbers",
  help: `field FILE

Solves the field of the geometry in FILE ("format": "stringwright-field", version 1; SI, the unit in the key):
  geometry  elements, columnDiameter_m, columnLength_m, footHeight_m, bandFraction (0.4 when missing),
            electrode { kind: none | sphere | toroid | disc, radius_m, tubeRadius_m, thickness_m, offset_m },
            shield { radius_m, from_m, to_m }, box { radius_m, top_m }, wallDistance_m, wire { radius_m, length_m }
  ask       idealisation: bands | distributed; resolution: 0.5 to 4; wall: round | plane
Lists hold inner nodes 1 … n-1, adjacent_F and series_F elements 1 … n, next to the tap first. Fields are for 1 V at the electrode.
A wall counts as an earthed cylinder all round at that distance; "plane" is a single flat one. A value that does not exist is null.
Exit 0: solved. 2: unusable input, with the key and why.
`,
  run(words, outside) {
    const { file } = readArguments(words, []);
    const text = readText(file, outside);
    let form: unknown;
    try {
      form = JSON.parse(text);
    } catch (error) {
      throw new Unusable(`${file} is not JSON: ${(error as Error).message}`);
    }
    const solved = answerField(form);
    if (!solved.ok) throw new Unusable(refusalText(solved.error));
    outside.print(`${JSON.stringify(solved.value)}\n`);
    return 0;
  },
};
