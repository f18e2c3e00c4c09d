import type { Level } from "../../solver/index.ts";
import "./level.css";

/** Clear is a filled circle, caution a triangle, stop an octagon; always with its word beside it or in its place. */
export function LevelMark({ level, word = true }: { readonly level: Level; readonly word?: boolean }) {
  return (
    <span className={`level level-${level}`}>
      <svg width={12} height={12} viewBox="0 0 12 12" aria-hidden="true">
        {shapes[level]}
      </svg>
      <span className={word ? "" : "unseen"}>{level}</span>
    </span>
  );
}

const shapes: Readonly<Record<Level, React.ReactNode>> = {
  clear: <circle cx={6} cy={6} r={4.5} />,
  caution: <path d="M6 1L11.5 11H.5z" />,
  stop: <path d="M3.7.5h4.6l3.2 3.2v4.6l-3.2 3.2H3.7L.5 8.3V3.7z" />,
};
