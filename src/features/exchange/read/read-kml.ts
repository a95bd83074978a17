import { kml } from '@tmcw/togeojson';
import type { Document, Element } from '@xmldom/xmldom';
import { FILE_PROBLEMS, FILE_REMARKS, THING_PROBLEMS } from '../words/files';
import { isDegrees, lineOf, textOf } from './broken-parts';
import { FileProblem } from './file-problem';
import type { RawFile, RawThing } from './raw-thing';

const isPlace = (tuple: string[]) => isDegrees(tuple[0]) && isDegrees(tuple[1]);

function brokenPlace(placemark: Element): { element: Element; tuple: string } | null {
  for (const element of Array.from(placemark.getElementsByTagName('coordinates'))) {
    for (const tuple of (element.textContent ?? '').trim().split(/\s+/)) {
      if (!isPlace(tuple.split(','))) return { element, tuple };
    }
  }
  for (const element of Array.from(placemark.getElementsByTagName('gx:coord'))) {
    const tuple = (element.textContent ?? '').trim();
    if (!isPlace(tuple.split(/\s+/))) return { element, tuple };
  }
  return null;
}

function takeBroken(document: Document): RawThing[] {
  const broken: RawThing[] = [];
  for (const placemark of Array.from(document.getElementsByTagName('Placemark'))) {
    const found = brokenPlace(placemark);
    if (!found) continue;
    const problem = THING_PROBLEMS.badTuple(lineOf(found.element), found.tuple.slice(0, 40));
    broken.push({ name: textOf(placemark, 'name'), notes: '', told: '', geometry: null, problem });
    placemark.parentNode?.removeChild(placemark);
  }
  return broken;
}

/** A description may be HTML: only its words are kept. */
function plainText(value: unknown): string {
  const raw =
    typeof value === 'string'
      ? value
      : typeof value === 'object' && value !== null && 'value' in value && typeof value.value === 'string'
        ? value.value
        : '';
  return raw
    .replace(/<[^<>]*>/g, ' ')
    .replace(/[ \t]+/g, ' ')
    .trim();
}

/** Placemarks of KML, in whatever folders they lie. */
export function readKml(document: Document): RawFile {
  if (document.documentElement?.localName !== 'kml') throw new FileProblem(FILE_PROBLEMS.kmlRoot);
  const remarks: string[] = [];
  if (Array.from(document.getElementsByTagName('href')).some((link) => /^\s*https?:/i.test(link.textContent ?? ''))) {
    remarks.push(FILE_REMARKS.links);
  }
  const broken = takeBroken(document);
  const things = kml(document).features.map(({ geometry, properties }): RawThing => {
    const { name, description, kind, notes, type } = properties ?? {};
    return {
      name: typeof name === 'string' ? name : '',
      notes: typeof notes === 'string' ? notes : plainText(description),
      told: [kind, type].filter((one): one is string => typeof one === 'string').join(' '),
      geometry,
    };
  });
  return { things: [...things, ...broken], remarks };
}
