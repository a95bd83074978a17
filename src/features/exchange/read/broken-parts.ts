import type { Element } from '@xmldom/xmldom';

const DEGREES = /^\s*[+-]?(\d+(\.\d*)?|\.\d+)(e[+-]?\d+)?\s*$/i;

/** A number of degrees as XML writes it: 'NaN', '12abc' and nothing at all are none. */
export function isDegrees(text: string | null | undefined): boolean {
  return text !== null && text !== undefined && DEGREES.test(text) && Number.isFinite(Number(text));
}

export function lineOf(element: Element): number | null {
  return element.lineNumber && element.lineNumber > 0 ? element.lineNumber : null;
}

export function textOf(element: Element, name: string): string {
  for (let child = element.firstChild; child; child = child.nextSibling) {
    if (child.nodeName === name || child.localName === name) return (child.textContent ?? '').trim();
  }
  return '';
}
