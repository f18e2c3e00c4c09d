const namespace = "http://www.w3.org/2000/svg";
const head = 52;
const edge = 8;
const kept = [
  "fill",
  "fill-opacity",
  "stroke",
  "stroke-opacity",
  "stroke-width",
  "stroke-dasharray",
  "stroke-linejoin",
  "paint-order",
  "opacity",
  "font-size",
  "font-family",
  "font-weight",
  "text-anchor",
];

/**
 * One standing SVG of everything drawn in a figure, colours resolved, with title and sentence above it,
 * as text that needs neither this page's styles nor its fonts.
 */
export function drawnSvg(figure: HTMLElement, title: string, sentence: string): string {
  const frame = figure.getBoundingClientRect();
  const plots = [...figure.querySelectorAll<SVGSVGElement>("svg[data-drawn], .plot svg")];
  const boxes = plots.map((plot) => plot.getBoundingClientRect());
  const top = Math.min(...boxes.map((box) => box.top));
  const height = Math.max(...boxes.map((box) => box.bottom)) - top + head + edge;
  const width = frame.width + 2 * edge;
  const root = document.createElementNS(namespace, "svg");
  const style = getComputedStyle(figure);
  setAll(root, { xmlns: namespace, width, height, viewBox: `0 0 ${width} ${height}` });
  const paper = getComputedStyle(document.documentElement).getPropertyValue("--paper").trim() || "#ffffff";
  root.append(made("rect", { width: "100%", height: "100%", fill: paper }));
  const family = style.fontFamily;
  root.append(made("text", { x: 8, y: 20, fill: style.color, "font-family": family, "font-size": 14 }, title));
  root.append(made("text", { x: 8, y: 38, fill: style.color, "font-family": family, "font-size": 12 }, sentence));
  for (const [i, plot] of plots.entries()) {
    const box = boxes[i]!;
    const copy = settled(plot);
    const [x, y] = [box.left - frame.left + edge, box.top - top + head];
    setAll(copy, { x, y, width: box.width, height: box.height, overflow: "visible" });
    root.append(copy);
  }
  return new XMLSerializer().serializeToString(root);
}

function settled(original: SVGElement): SVGElement {
  const copy = original.cloneNode(false) as SVGElement;
  const style = getComputedStyle(original);
  for (const name of kept) {
    const value = style.getPropertyValue(name);
    if (value !== "") copy.setAttribute(name, value.replaceAll('"', "'"));
  }
  for (const name of ["class", "style", "tabindex", "role"]) copy.removeAttribute(name);
  for (const child of original.childNodes) {
    if (child instanceof SVGElement) copy.append(settled(child));
    else if (child.nodeType === Node.TEXT_NODE) copy.append(child.cloneNode());
  }
  return copy;
}

function made(name: string, attributes: Record<string, string | number>, text?: string): SVGElement {
  const element = document.createElementNS(namespace, name);
  setAll(element, attributes);
  if (text !== undefined) element.append(text);
  return element;
}

function setAll(element: SVGElement, attributes: Record<string, string | number>): void {
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, String(value));
}
