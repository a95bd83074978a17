/** A wind strip in a cell, px: shading down to `shade`, the line of the compass, the bars of the arcs on it. */
export const MINI_STRIP = { width: 72, height: 13, shade: 8, line: 10.5, bar: 9 } as const;
