import type { Caution } from "../../solver/index.ts";

interface Props {
  readonly cautions: readonly Caution[];
  readonly screen: Caution["where"][number];
}

/** The cautions of a screen, standing at its top; they print with it. */
export function Cautions({ cautions, screen }: Props) {
  const shown = cautions.filter((caution) => caution.where.includes(screen));
  if (shown.length === 0) return null;
  return (
    <section className="cautions" aria-label="cautions">
      <ul>
        {shown.map((caution) => (
          <li key={caution.id} className={caution.id.toLowerCase().includes("zero") ? "loudest" : ""}>
            {caution.text}
          </li>
        ))}
      </ul>
    </section>
  );
}
