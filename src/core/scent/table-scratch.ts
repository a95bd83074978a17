/** Entries in the order they are made, before they are put in order of bin. Grows; kept by the ground for the next table. */
export interface TableScratch {
  count: number;
  bins: Int32Array;
  values: Float32Array;
}

export function tableScratch(): TableScratch {
  return { count: 0, bins: new Int32Array(4096), values: new Float32Array(4 * 4096) };
}

/** Makes room for more entries, keeping those made. */
export function reserve(out: TableScratch, more: number): void {
  if (out.count + more <= out.bins.length) return;
  const bins = new Int32Array(2 * (out.count + more));
  const values = new Float32Array(4 * bins.length);
  bins.set(out.bins);
  values.set(out.values);
  out.bins = bins;
  out.values = values;
}
