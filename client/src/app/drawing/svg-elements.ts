import type { SvgNode } from '@second-spanner/shared/drawing/to-svg';

const svgSpace = 'http://www.w3.org/2000/svg';

/** Real SVG elements of a drawing's nodes. Attributes and text are set as such, so nothing is parsed. */
export function svgElements(document: Document, nodes: readonly SvgNode[]): SVGElement[] {
  return nodes.map((node) => {
    const element = document.createElementNS(svgSpace, node.tag);
    for (const [name, value] of Object.entries(node.attributes)) element.setAttribute(name, value);
    if (node.text !== undefined) element.textContent = node.text;
    element.append(...svgElements(document, node.children ?? []));
    return element;
  });
}
