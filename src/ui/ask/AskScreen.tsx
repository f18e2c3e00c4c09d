import { useDocument } from "../frame/session.ts";
import { Assumed } from "./Assumed.tsx";
import { Instruments } from "./Instruments.tsx";
import { NameField } from "./NameField.tsx";
import { Policy } from "./Policy.tsx";
import { SourceAsked } from "./SourceAsked.tsx";
import { Surroundings } from "./Surroundings.tsx";
import { Wanted } from "./Wanted.tsx";
import { Waveform } from "./Waveform.tsx";
import "./ask.css";

/** What to measure: waveform, source, who reads it, surroundings, and the engineer's policy. Every field answers at once. */
export function AskScreen() {
  const { brief } = useDocument();
  return (
    <>
      <NameField />
      <Assumed />
      <Waveform brief={brief} />
      <Wanted brief={brief} />
      <Instruments />
      <SourceAsked brief={brief} />
      <Surroundings brief={brief} />
      <Policy brief={brief} />
    </>
  );
}
