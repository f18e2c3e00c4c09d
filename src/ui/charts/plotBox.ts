/** Where the plot's inner box lies: fixed margins, so that cursor and labels need not ask the chart. */
export interface PlotBox {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export const axisWidth = 60;
export const axisHeight = 34;
export const topMargin = 10;

/** @param labels room for end labels at the right, px */
export function plotBox(width: number, height: number, labels: number): PlotBox {
  return {
    width,
    height,
    left: axisWidth,
    right: width - labels,
    top: topMargin,
    bottom: height - axisHeight,
  };
}
