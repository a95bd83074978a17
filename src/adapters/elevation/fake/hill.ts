const M_PER_DEGREE = 111_320;

/** Made-up hills: two smooth swells across each other, about 60 m high and 2 km apart, the same for everyone. */
export function hillHeightM({ lat, lon }: { lat: number; lon: number }): number {
  const north = lat * M_PER_DEGREE;
  const east = lon * M_PER_DEGREE * Math.cos((lat * Math.PI) / 180);
  return 300 + 30 * Math.sin(north / 420 + Math.sin(east / 900)) + 25 * Math.cos(east / 350 - north / 1100);
}
