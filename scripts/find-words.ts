import { parseSync } from 'vite';

/** Texts for people in a piece of TypeScript: what `check-words.ts` allows only in words files. */

export interface FoundText {
  line: number;
  text: string;
}

export interface SyntaxNode {
  type: string;
  start: number;
  end: number;
  [key: string]: unknown;
}

/** How much of what stands here people read: all of it, all but codes of one small word, what looks like it, nothing. */
type Read = 'all' | 'most' | 'look' | 'none';

const READ_WHOLE =
  /^(title|label|hint|placeholder|alt|message|unit|aria-(label|description|roledescription|valuetext)|\w+Label)$/;
const READ_MOSTLY =
  /^(heading|legend|caption|subject|subtitle|detail|description|summary|empty|note|said|text|term|children|\w+(Text|Title|Note|Hint))$/;
const FOR_MACHINES =
  /^(className|\w*ClassName|style|d|transform|points|viewBox|preserveAspectRatio|log|href|data-.*|autoComplete|accept|sizes|type|\w*[fF]allback|key|prodId|[A-Z]\w*-[\w-]*)$/;
/** Calls whose texts are for us: the log, the database, faults of the program, parts looked for, class names, rules of the browser. */
const CALLS_FOR_US =
  /^(log\.\w+|console\.\w+|(\w*\.)?sql|client\.execute|.*\.(includes|startsWith|endsWith)|joinClasses|Error|RangeError|TypeError|URL|RegExp|Intl\.\w+|(.*\.)?matchMedia|press|.*\.(on|off)|.*\.querySelector\w*|.*\.getElementsBy\w+|.*\.closest|z\.literal)$/;
const BARE_CLASS =
  /^(absolute|block|border|capitalize|container|contents|fixed|flex|grid|group|hidden|inline|invisible|italic|outline|peer|relative|rounded|static|sticky|table|truncate|underline|uppercase|lowercase|transition|shadow)$/;

const isNode = (value: unknown): value is SyntaxNode => typeof value === 'object' && value !== null && 'type' in value;

function nameOf(node: unknown): string {
  if (!isNode(node)) return '';
  if (node.type === 'MemberExpression') return `${nameOf(node.object)}.${nameOf(node.property)}`;
  if (node.type === 'JSXNamespacedName') return `${nameOf(node.namespace)}:${nameOf(node.name)}`;
  return String(node.name ?? node.value ?? '');
}

/** Each token is a known bare class or has a sign that no word has. */
const isClasses = (text: string) =>
  text
    .trim()
    .split(/\s+/)
    .every(
      (token) => /^[a-z!*[-][\w:[\]()./%!&>*=,#'-]*$/.test(token) && (/[-:[/\d]/.test(token) || BARE_CLASS.test(token)),
    );

/** Values of `Evidence` and `Word` in core, and what no language changes: our name, signs of units. */
const NO_TEXT = new Set([
  'our choice',
  'club log',
  'Quiet',
  'Touchy',
  'Loud',
  'Windrest',
  'yd',
  'ft',
  'in',
  'cm',
  'mi',
  'km',
  'lb',
  'kg',
  'mph',
]);

/** Two words, or one with a capital; neither markup, a run of style rules nor a media type. */
function looksRead(text: string): boolean {
  if (/^\s*<|^[a-z-]+:\S+;|^\w+\/[\w+.-]+(; charset=\S+)?$|^\(.*: .*\)$/.test(text)) return false;
  if (/^[A-Z][a-z]+(…|[.!?])?$/.test(text.trim())) return true;
  return /[\p{L}\d,;:)]\s+[\p{L}(]/u.test(text) && /\p{L}{2}/u.test(text) && !isClasses(text);
}

/** Whether a template has words beside its values: ' min late' is one, 'rotate(' is none. */
function templateReads(node: SyntaxNode): boolean {
  const parts = (node.quasis as { value: { cooked: string } }[]).map((q) => q.value.cooked.replace(/\d+px/g, ''));
  if (parts[0]?.startsWith('<') || isClasses(parts.join('x-')) || parts.every((part) => /^[/?#&=\w:.@%-]*$/.test(part)))
    return false;
  const word = /(^|\s|[(,;])\p{L}{2,}[,.;:!?']?(\s|$)|\p{L}{2,}[,.;:!?]?\s|\s\p{L}{2,}|^\p{L}{2,}$/u;
  return parts.some((part) => word.test(part));
}

function readOf(node: SyntaxNode, outer: Read): Read {
  const key = nameOf(node.key ?? node.name);
  switch (node.type) {
    case 'JSXAttribute':
    case 'Property':
    case 'PropertyDefinition':
      if (FOR_MACHINES.test(key)) return 'none';
      if (READ_WHOLE.test(key)) return 'all';
      if (READ_MOSTLY.test(key)) return 'most';
      return node.type === 'Property' && outer !== 'none' ? 'look' : outer;
    case 'JSXOpeningElement':
      return 'look';
    case 'NewExpression':
    case 'CallExpression':
      return CALLS_FOR_US.test(nameOf(node.callee)) ? 'none' : 'look';
    case 'BinaryExpression':
      return /^[!=]==$/.test(String(node.operator)) ? 'none' : outer;
    default:
      return outer;
  }
}

function isPassedOver(node: SyntaxNode): boolean {
  if (/^(ImportDeclaration|ImportExpression|ExportAllDeclaration|JSXClosingElement)$/.test(node.type)) return true;
  if (node.type === 'ExportNamedDeclaration') return Boolean(node.source);
  if (node.type === 'ExpressionStatement') return Boolean(node.directive);
  if (node.type === 'TaggedTemplateExpression') return CALLS_FOR_US.test(nameOf(node.tag));
  return /^TS(?!As|Satisfies|NonNull)/.test(node.type);
}

/** A key, a test and a place in an object are never what is shown. */
const isAsked = (part: string, node: SyntaxNode) =>
  part === 'test' || (part === 'key' && !node.computed) || (part === 'property' && node.type === 'MemberExpression');

export function eachText(path: string, source: string, see: (node: SyntaxNode, text: string) => void): void {
  const { program, errors } = parseSync(path, source);
  if (errors.length > 0) throw new Error(`${path}: ${errors[0]?.message}`);

  function walk(node: SyntaxNode, outer: Read): void {
    if (isPassedOver(node)) return;
    const { value } = node;
    if (node.type === 'JSXText') {
      if (/\p{L}{2}/u.test(String(value))) see(node, String(value));
      return;
    }
    if (node.type === 'Literal') {
      if (typeof value !== 'string' || outer === 'none' || NO_TEXT.has(value)) return;
      const reads = outer === 'look' ? looksRead(value) : /\p{L}{2}/u.test(value);
      if (reads && !(outer === 'most' && /^[a-z][\w-]*$/.test(value))) see(node, value);
      return;
    }
    if (node.type === 'TemplateLiteral' && outer !== 'none' && templateReads(node)) {
      see(node, source.slice(node.start, node.end));
    }
    const inside = readOf(node, outer);
    const isRefusal = node.type === 'NewExpression' && nameOf(node.callee) === 'AppError';
    for (const [part, child] of Object.entries(node)) {
      if (/^type(Annotation|Arguments|Parameters)$/.test(part)) continue;
      (Array.isArray(child) ? child : [child]).forEach((one, index) => {
        if (!isNode(one)) return;
        if (isAsked(part, node)) walk(one, 'none');
        else if (isRefusal && part === 'arguments' && index === 1) walk(one, 'all');
        else walk(one, inside);
      });
    }
  }
  walk(program as unknown as SyntaxNode, 'look');
}

export function findWords(path: string, source: string): FoundText[] {
  const found: FoundText[] = [];
  eachText(path, source, (node, text) => {
    const line = source.slice(0, node.start).split('\n').length;
    found.push({ line, text: text.replace(/\s+/g, ' ').trim() });
  });
  return found;
}
