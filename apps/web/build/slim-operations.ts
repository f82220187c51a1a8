import { parseSync } from 'vite';
import type { Plugin } from 'vite';

/** The browser sends what TypeScript has checked and parses bodies alone; these schemas are only types there. */
const UNREAD = new Set(['params', 'query', 'response']);

interface Node {
  readonly type: string;
  readonly start: number;
  readonly end: number;
}
interface Property extends Node {
  readonly key?: Node & { readonly name?: string };
  readonly value?: Node & { readonly raw?: string };
}
interface Call extends Node {
  readonly callee?: Node & { readonly name?: string };
  readonly arguments?: readonly (Node & { readonly properties?: readonly Property[] })[];
}

/** Calls of `operation({ … })`, wherever they stand in the module. */
function callsOf(node: unknown): Call[] {
  if (typeof node !== 'object' || node === null) return [];
  const inside = Object.values(node).flatMap(callsOf);
  const call = node as Call;
  return call.type === 'CallExpression' && call.callee?.name === 'operation' ? [call, ...inside] : inside;
}

/**
 * A contract module with the schemas that the browser never reads taken out: null stays null, any other becomes true.
 * It keeps the schema library off the first page.
 */
export function slimOperations(code: string): string {
  const properties = callsOf(parseSync('operation.js', code).program).flatMap(
    (call) => call.arguments?.[0]?.properties ?? [],
  );
  return properties
    .filter(({ key, value }) => UNREAD.has(key?.name ?? '') && value?.raw !== 'null')
    .toSorted((a, b) => b.start - a.start)
    .reduce((text, { value, end, start }) => {
      if (value === undefined) return text;
      const shorthand = value.start === start;
      const name = shorthand ? `${text.slice(value.start, value.end)}: ` : '';
      return `${text.slice(0, value.start)}${name}true${text.slice(end)}`;
    }, code);
}

export function slimContract(): Plugin {
  return {
    name: 'tipward:slim-contract',
    transform: {
      filter: { id: /packages\/contract\/src\/\w+\/[\w-]+\.ts$/u, code: 'operation(' },
      handler: (code) => ({ code: slimOperations(code), map: null }),
    },
  };
}
