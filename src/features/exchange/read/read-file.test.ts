import { strToU8, zipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import { readMapFile } from './read-file';

const GPX = (inside: string) =>
  `<?xml version="1.0"?>\n<gpx xmlns="http://www.topografix.com/GPX/1/1" version="1.1" creator="x">\n${inside}\n</gpx>`;
const KML = (inside: string) => `<kml xmlns="http://www.opengis.net/kml/2.2"><Document>\n${inside}\n</Document></kml>`;

function read(text: string | Uint8Array) {
  return readMapFile(typeof text === 'string' ? new TextEncoder().encode(text) : text);
}

function good(text: string | Uint8Array) {
  const result = read(text);
  if (!result.ok) throw new Error(result.message);
  return result;
}

function refusal(text: string | Uint8Array): string {
  const result = read(text);
  if (result.ok) throw new Error('This was read, and should not have been.');
  return result.message;
}

describe('GPX', () => {
  it('reads waypoints, routes and tracks with what they are called', () => {
    const { format, things } = good(
      GPX(
        `<wpt lat="34.1" lon="-84.01"><name>Oak</name><desc>By the creek</desc><sym>Ladder</sym></wpt>
<rte><name>Way</name><rtept lat="34.1" lon="-84"/><rtept lat="34.2" lon="-84"/></rte>
<trk><name>Path</name><type>trail</type><trkseg><trkpt lat="34.1" lon="-84"/><trkpt lat="34.15" lon="-84.02"/></trkseg></trk>`,
      ),
    );
    expect(format).toBe('gpx');
    expect(things.find(({ name }) => name === 'Oak')).toMatchObject({
      notes: 'By the creek',
      told: 'Ladder',
      geometry: { type: 'Point', coordinates: [-84.01, 34.1] },
      problem: null,
    });
    expect(things.find(({ name }) => name === 'Path')).toMatchObject({
      told: 'trail',
      geometry: {
        type: 'LineString',
        coordinates: [
          [-84, 34.1],
          [-84.02, 34.15],
        ],
      },
    });
    expect(things).toHaveLength(3);
  });

  it('names the line of a point that is none and keeps the rest', () => {
    const { things } = good(
      GPX('<wpt lat="NaN" lon="-84"><name>Bad</name></wpt>\n<wpt lat="34.1" lon="-84"><name>Good</name></wpt>'),
    );
    expect(things.find(({ name }) => name === 'Bad')?.problem).toContain('Line 3');
    expect(things.find(({ name }) => name === 'Good')?.problem).toBeNull();
  });

  it('refuses a whole track for one bad point rather than bending it', () => {
    const { things } = good(
      GPX(
        `<trk><name>T</name><trkseg>\n<trkpt lat="34.1" lon="-84"/>\n<trkpt lat="34.2" lon=""/>\n<trkpt lat="34.3" lon="-84"/></trkseg></trk>`,
      ),
    );
    expect(things).toHaveLength(1);
    expect(things[0]?.problem).toContain('Line 5');
    expect(things[0]?.geometry).toBeNull();
  });

  it('drops heights and says so', () => {
    const { remarks, things } = good(GPX('<wpt lat="34.1" lon="-84"><ele>300.5</ele><name>A</name></wpt>'));
    expect(remarks.join()).toContain('Heights');
    expect(things[0]?.geometry).toEqual({ type: 'Point', coordinates: [-84, 34.1] });
  });

  it('makes an area of a track marked as one, holes and all', () => {
    const ring = (d: number) =>
      `<trkseg>${[
        [0, 0],
        [d, 0],
        [d, d],
        [0, 0],
      ]
        .map(([x = 0, y = 0]) => `<trkpt lat="${34 + y}" lon="${-84 + x}"/>`)
        .join('')}</trkseg>`;
    const { things } = good(GPX(`<trk><name>W</name><type>area item:wood</type>${ring(0.01)}${ring(0.002)}</trk>`));
    expect(things).toHaveLength(1);
    expect(things[0]?.geometry?.type).toBe('Polygon');
    expect(things[0]?.geometry?.coordinates).toHaveLength(2);
  });
});

describe('attacks and damage', () => {
  const bomb = `<?xml version="1.0"?>\n<!DOCTYPE gpx [\n<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;&a;&a;&a;&a;&a;">\n]>\n<gpx version="1.1"><wpt lat="1" lon="1"><name>&b;</name></wpt></gpx>`;

  it('refuses entities before they are read, with the line', () => {
    expect(refusal(bomb)).toContain('Line 2');
    expect(refusal(`<!DOCTYPE kml SYSTEM "file:///etc/passwd">\n${KML('')}`)).toContain('Line 1');
  });

  it('takes the same words in a comment or CDATA for text', () => {
    const { things } = good(
      KML(
        '<!-- <!DOCTYPE x> --><Placemark><name>A</name><description><![CDATA[<!DOCTYPE html><b>Note</b>]]></description><Point><coordinates>-84,34.1</coordinates></Point></Placemark>',
      ),
    );
    expect(things[0]?.notes).toContain('Note');
  });

  it('gives up a KMZ that unpacks to far more than it is', () => {
    const huge = zipSync({ 'doc.kml': new Uint8Array(120 * 1024 * 1024) }, { level: 9 });
    expect(huge.length).toBeLessThan(200_000);
    expect(refusal(huge)).toContain('far more than a map needs');
  }, 60_000);

  it('does not believe the sizes that an archive gives of itself', () => {
    const lying = zipSync({ 'doc.kml': new Uint8Array(120 * 1024 * 1024) }, { level: 9 });
    const view = new DataView(lying.buffer, lying.byteOffset);
    // Uncompressed size in the local header (APPNOTE.TXT 4.3.7).
    view.setUint32(22, 100, true);
    expect(refusal(lying)).toMatch(/far more than a map needs|damaged/);
  }, 60_000);

  it('says when an archive has no KML, or is cut short', () => {
    expect(refusal(zipSync({ 'a.txt': strToU8('x') }))).toContain('no KML');
    const whole = zipSync({ 'doc.kml': strToU8(KML('<Placemark/>'.repeat(2000))) }, { level: 0 });
    expect(refusal(whole.slice(0, 2000))).toMatch(/cut short|damaged/);
  });

  it('says which line of broken XML stops it', () => {
    expect(refusal(GPX('<wpt lat="1" lon="2">\n<name>A</nam>\n</wpt>'))).toContain('Line 4');
    expect(refusal('<gpx version="1.1"><wpt lat="1" lon="2">')).toContain('cut short');
  });

  it('refuses what is no map', () => {
    expect(refusal(new Uint8Array())).toContain('empty');
    expect(refusal(Uint8Array.from([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0]))).toContain('no file of a map');
    expect(refusal('<html><body>Sign in</body></html>')).toContain('neither GPX nor KML');
    expect(refusal('{"type":"FeatureCollection","features":[]}')).toContain('nothing in the file');
  });
});

describe('KML and KMZ', () => {
  const placemark =
    '<Placemark><name>Plot</name><ExtendedData><Data name="kind"><value>feature:food_plot</value></Data></ExtendedData><Polygon><outerBoundaryIs><LinearRing><coordinates>-84,34.1,200 -84.01,34.1,200 -84.01,34.11,200 -84,34.1,200</coordinates></LinearRing></outerBoundaryIs></Polygon></Placemark>';

  it('reads placemarks, and the same out of an archive', () => {
    for (const bytes of [
      strToU8(KML(placemark)),
      zipSync({ 'a/doc.kml': strToU8(KML(placemark)), 'b.png': strToU8('x') }),
    ]) {
      const { things } = good(bytes);
      expect(things).toHaveLength(1);
      expect(things[0]).toMatchObject({ name: 'Plot', told: 'feature:food_plot', problem: null });
      expect(things[0]?.geometry?.coordinates).toEqual([
        [
          [-84, 34.1],
          [-84.01, 34.1],
          [-84.01, 34.11],
          [-84, 34.1],
        ],
      ]);
    }
  });

  it('parts a shape of several parts, and names the line of a bad place', () => {
    const { things } = good(
      KML(
        `<Placemark><name>Two</name><MultiGeometry><Point><coordinates>-84,34</coordinates></Point><Point><coordinates>-84.1,34</coordinates></Point></MultiGeometry></Placemark>
<Placemark><name>Bad</name><Point><coordinates>-84,north</coordinates></Point></Placemark>`,
      ),
    );
    expect(things.map(({ name }) => name)).toEqual(['Two 1', 'Two 2', 'Bad']);
    expect(things[2]?.problem).toContain('Line 3');
  });
});

describe('GeoJSON', () => {
  const collection = (features: unknown[]) => JSON.stringify({ type: 'FeatureCollection', features });
  const at = (coordinates: unknown, properties = {}) => ({
    type: 'Feature',
    properties,
    geometry: { type: 'Point', coordinates },
  });

  it('names the feature that is wrong', () => {
    const { things } = good(collection([at([-84, 34]), at([-84, null]), { type: 'Nothing' }, at([741000, 3777000])]));
    expect(things.map(({ problem }) => problem)).toEqual([
      null,
      expect.stringContaining('Place 1'),
      expect.stringContaining('Feature 3'),
      expect.stringContaining('not in degrees'),
    ]);
  });

  it('names the line of NaN and of broken JSON', () => {
    expect(refusal('{"type":"Feature",\n"geometry":{"type":"Point",\n"coordinates":[NaN,1]}}')).toContain('Line 3');
    expect(refusal('{"type":"FeatureCollection",\n"features":[')).toContain('cut short');
  });

  it('refuses another system of coordinates by its name', () => {
    const text = JSON.stringify({
      type: 'FeatureCollection',
      crs: { type: 'name', properties: { name: 'urn:ogc:def:crs:EPSG::26916' } },
      features: [at([1, 2])],
    });
    expect(refusal(text)).toContain('EPSG::26916');
  });

  it('thins a line of too many points and says by how little', () => {
    const line = Array.from({ length: 5000 }, (_, i) => [-84 + i * 1e-5, 34 + Math.sin(i / 200) * 1e-3]);
    const { things } = good(JSON.stringify({ type: 'LineString', coordinates: line }));
    const geometry = things[0]?.geometry;
    expect(geometry?.type === 'LineString' && geometry.coordinates.length).toBeLessThanOrEqual(1000);
    expect(things[0]?.remarks[0]).toMatch(/Thinned from 5000 points to \d+, none more than 1 m off/);
  });

  it('refuses more things than are read at once', () => {
    expect(refusal(collection(Array.from({ length: 5001 }, () => at([-84, 34]))))).toContain('5001 features');
  });
});

describe('CSV', () => {
  it('reads comma, semicolon and tab, decimal commas, letters and quotes', () => {
    const comma = good('Name,Latitude,Longitude,Notes\n"Oak, old",34.1,84.01 W,"a ""b"""\n');
    expect(comma.things[0]).toMatchObject({ name: 'Oak, old', notes: 'a "b"' });
    expect(comma.things[0]?.geometry?.coordinates).toEqual([-84.01, 34.1]);
    expect(good('name;lat;lon\nA;34,5;-84,25').things[0]?.geometry?.coordinates).toEqual([-84.25, 34.5]);
    expect(good('name\tlat\tlon\nA\t34.5\t-84.25').things[0]?.geometry?.coordinates).toEqual([-84.25, 34.5]);
  });

  it('counts lines as an editor does, through notes of several lines', () => {
    const { things } = good('name,lat,lon,notes\nA,34.1,-84,"two\nlines"\nB,here,-84,\nC,34.1,,');
    expect(things.map(({ problem }) => problem)).toEqual([
      null,
      expect.stringContaining('Line 4'),
      expect.stringContaining('Line 5'),
    ]);
  });

  it('refuses a table without places, an open quote and an over-long line, each by its line', () => {
    expect(refusal('name,where\nA,here')).toContain('Line 1 has no headings');
    expect(refusal(`name,lat,lon\nA,1,2\n"${'x'.repeat(30_000)}",1,2`)).toContain('Line 3');
    expect(refusal('name,lat,lon\n"A,34.1,-84\n')).toContain('Line 2');
  });

  it('reads other encodings, and says when it had to guess', () => {
    const latin = Uint8Array.from([...strToU8('name,lat,lon\nCa'), 0xf1, ...strToU8('on,34.1,-84\n')]);
    const { things, remarks } = good(latin);
    expect(things[0]?.name).toBe('Cañon');
    expect(remarks.join()).toContain('Windows Western');
    const wide = new Uint8Array(Buffer.from('\ufeffname,lat,lon\nCañon,34.1,-84\n', 'utf16le'));
    expect(good(wide).things[0]?.name).toBe('Cañon');
  });
});

it('reads XML in the encoding it declares, and names the line of bytes that are none', () => {
  const declared = Uint8Array.from([
    ...strToU8('<?xml version="1.0" encoding="ISO-8859-1"?><gpx version="1.1"><wpt lat="1" lon="2"><name>Ca'),
    0xf1,
    ...strToU8('on</name></wpt></gpx>'),
  ]);
  expect(good(declared).things[0]?.name).toBe('Cañon');
  const bad = Uint8Array.from([
    ...strToU8('<gpx version="1.1">\n<wpt lat="1" lon="2"><name>'),
    0xf1,
    ...strToU8('</name></wpt></gpx>'),
  ]);
  expect(refusal(bad)).toContain('Line 2');
});
