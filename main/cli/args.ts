import { parseArgs } from 'node:util';
import { nearest } from '../../src/quantity/nearest.js';

/** What a command line asks for. */
export type Call =
  | { readonly ask: 'help' }
  | { readonly ask: 'version' }
  | {
      readonly ask: 'size';
      readonly job: string;
      /** file for the report; "-" for standard output */
      readonly json: string | null;
      readonly csv: string | null;
      readonly stock: string | null;
      readonly quiet: boolean;
    };

/** A command line as read, or what is wrong with it in a sentence. */
export type CallResult = { readonly ok: true; readonly call: Call } | { readonly ok: false; readonly message: string };

const OPTIONS = {
  json: { type: 'string' },
  csv: { type: 'string' },
  stock: { type: 'string' },
  memo: { type: 'string' },
  quiet: { type: 'boolean' },
  help: { type: 'boolean', short: 'h' },
  version: { type: 'boolean' },
} as const;

type OptionName = keyof typeof OPTIONS;

const NAMES = Object.keys(OPTIONS);

interface OptionToken {
  readonly name: string;
  readonly rawName: string;
  readonly value: string | undefined;
  readonly inline: boolean;
}

function isKnown(name: string): name is OptionName {
  return Object.hasOwn(OPTIONS, name);
}

function unknownOption({ name, rawName }: OptionToken): string {
  const near = nearest(name, NAMES);
  return `${rawName} is not an option; expected ${near === null ? NAMES.map((own) => `--${own}`).join(', ') : `--${near}`}`;
}

/** What is wrong with one option, or null. */
function optionFault(option: OptionToken): string | null {
  const { name, rawName, value, inline } = option;
  if (!isKnown(name)) return unknownOption(option);
  if (OPTIONS[name].type === 'boolean') return value === undefined ? null : `${rawName} takes no value`;
  // "--json --quiet" is a name forgotten, not a file called "--quiet"
  const forgotten = value === undefined || value === '' || (!inline && value.startsWith('-') && value !== '-');
  if (forgotten) return `${rawName} wants the name of a file after it`;
  if (value === '-' && name !== 'json') return `${rawName} - is not possible; expected the name of a file`;
  return null;
}

function faultOf(options: readonly OptionToken[], jobs: readonly string[]): string | null {
  const faults = options.map(optionFault).find((fault) => fault !== null);
  if (faults !== undefined) return faults;
  const twice = options.find(({ name }, index) => options.findIndex((other) => other.name === name) !== index);
  if (twice !== undefined) return `${twice.rawName} is given twice; expected it once`;
  const asked = options.some(({ name }) => name === 'help' || name === 'version');
  if (asked) return null;
  if (options.some(({ name }) => name === 'memo')) return '--memo: this version does not print memos yet';
  if (jobs.length === 0 || jobs[0] === '') return 'the job file is missing; expected size JOB [options], or --help';
  return jobs.length > 1 ? `${jobs.length} job files are given; expected one` : null;
}

function callOf(options: readonly OptionToken[], job: string): Call {
  const has = (name: OptionName): boolean => options.some((option) => option.name === name);
  const fileOf = (name: OptionName): string | null => options.find((option) => option.name === name)?.value ?? null;
  if (has('help')) return { ask: 'help' };
  if (has('version')) return { ask: 'version' };
  return { ask: 'size', job, json: fileOf('json'), csv: fileOf('csv'), stock: fileOf('stock'), quiet: has('quiet') };
}

/** Reads the arguments after the program's name. */
export function readCall(argv: readonly string[]): CallResult {
  const { tokens, positionals } = parseArgs({
    args: [...argv],
    options: OPTIONS,
    strict: false,
    allowPositionals: true,
    tokens: true,
  });
  const options = tokens.flatMap((token) =>
    token.kind === 'option'
      ? [{ name: token.name, rawName: token.rawName, value: token.value, inline: token.inlineValue === true }]
      : [],
  );
  const message = faultOf(options, positionals);
  return message === null ? { ok: true, call: callOf(options, positionals[0] ?? '') } : { ok: false, message };
}
