import { lazy } from "react";

/** The drawing itself is fetched only when the first chart comes into view. */
export const LinePlot = lazy(() => import("./LinePlot.tsx").then((m) => ({ default: m.LinePlot })));
export const BarPlot = lazy(() => import("./BarPlot.tsx").then((m) => ({ default: m.BarPlot })));
