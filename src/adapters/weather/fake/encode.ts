import { Builder } from 'flatbuffers';

/**
 * Writes the weather service's binary answer (FlatBuffers). The SDK holds readers only, so tables are built here by slot
 * number: slot n is read at offset 4 + 2n in @openmeteo/sdk's weather-api-response, variables-with-time and
 * variable-with-values.
 */
export interface EncodedVariable {
  /** Number in the SDK's Variable. */
  variable: number;
  /** Number in the SDK's Unit. */
  unit: number;
  altitudeM?: number;
  member?: number;
  values: number[];
}

export interface EncodedSeries {
  /** Unix seconds; `end` is past the last value. */
  start: number;
  end: number;
  intervalS: number;
  variables: EncodedVariable[];
}

export interface EncodedAnswer {
  lat: number;
  lon: number;
  current: EncodedSeries | null;
  hourly: EncodedSeries | null;
}

export function encodeAnswer(answer: EncodedAnswer): Uint8Array<ArrayBuffer> {
  const builder = new Builder(64 * 1024);
  const current = answer.current && series(builder, answer.current, true);
  const hourly = answer.hourly && series(builder, answer.hourly, false);
  const zone = builder.createString('GMT');
  builder.startObject(15);
  builder.addFieldFloat32(0, answer.lat, 0);
  builder.addFieldFloat32(1, answer.lon, 0);
  builder.addFieldFloat32(3, 0.5, 0);
  builder.addFieldOffset(7, zone, 0);
  builder.addFieldOffset(8, zone, 0);
  if (current) builder.addFieldOffset(9, current, 0);
  if (hourly) builder.addFieldOffset(11, hourly, 0);
  builder.finishSizePrefixed(builder.endObject());
  return Uint8Array.from(builder.asUint8Array());
}

function series(builder: Builder, of: EncodedSeries, single: boolean): number {
  const variables = of.variables.map((variable) => oneVariable(builder, variable, single));
  builder.startVector(4, variables.length, 4);
  for (const offset of variables.toReversed()) builder.addOffset(offset);
  const vector = builder.endVector();
  builder.startObject(4);
  builder.addFieldInt64(0, BigInt(of.start), 0n);
  builder.addFieldInt64(1, BigInt(of.end), 0n);
  builder.addFieldInt32(2, of.intervalS, 0);
  builder.addFieldOffset(3, vector, 0);
  return builder.endObject();
}

function oneVariable(builder: Builder, of: EncodedVariable, single: boolean): number {
  let vector = 0;
  if (!single) {
    builder.startVector(4, of.values.length, 4);
    for (const value of of.values.toReversed()) builder.addFloat32(value);
    vector = builder.endVector();
  }
  builder.startObject(13);
  builder.addFieldInt8(0, of.variable, 0);
  builder.addFieldInt8(1, of.unit, 0);
  if (single) builder.addFieldFloat32(2, of.values[0] ?? 0, 0);
  else builder.addFieldOffset(3, vector, 0);
  builder.addFieldInt16(5, of.altitudeM ?? 0, 0);
  builder.addFieldInt16(10, of.member ?? 0, 0);
  return builder.endObject();
}
