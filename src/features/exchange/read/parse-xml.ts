import { DOMParser, type Document, ParseError } from '@xmldom/xmldom';
import { FILE_PROBLEMS } from '../words/files';
import { FileProblem, lineAt } from './file-problem';
import { MOST_ELEMENTS } from './limits';

/** Where comments and CDATA begin and end: what stands inside them is text. */
const PLAIN_PARTS = [
  { from: '<!--', to: '-->' },
  { from: '<![CDATA[', to: ']]>' },
];

/** Steps over every '<!', and finds one that declares a document type or an entity. One pass, whatever the text. */
function findDeclaration(text: string): number {
  let at = text.indexOf('<!');
  while (at >= 0) {
    const part = PLAIN_PARTS.find(({ from }) => text.startsWith(from, at));
    if (!part) return at;
    const end = text.indexOf(part.to, at + part.from.length);
    if (end < 0) return -1;
    at = text.indexOf('<!', end + part.to.length);
  }
  return -1;
}

function countElements(text: string): number {
  let count = 0;
  for (let at = text.indexOf('<'); at >= 0; at = text.indexOf('<', at + 1)) if (text[at + 1] !== '/') count += 1;
  return count;
}

/** XML as a tree. Declarations of types and entities are refused before the parser sees them. */
export function parseXml(text: string): Document {
  const declared = findDeclaration(text);
  if (declared >= 0) {
    throw new FileProblem(FILE_PROBLEMS.declared(lineAt(text, declared)));
  }
  if (countElements(text) > MOST_ELEMENTS) {
    throw new FileProblem(FILE_PROBLEMS.elements);
  }

  try {
    return new DOMParser({
      onError: (level, message, context) => {
        if (level !== 'warning') throw new ParseError(message, context?.locator);
      },
    }).parseFromString(text, 'text/xml');
  } catch (error) {
    const line = error instanceof ParseError ? error.locator?.lineNumber : undefined;
    throw new FileProblem(line && line > 0 ? FILE_PROBLEMS.brokenXmlOn(line) : FILE_PROBLEMS.brokenXml);
  }
}
