import type { Problem } from '../../src/material/problem.js';

/** Straight quotation marks in pairs, as set type has them. */
function withQuotes(text: string): string {
  return text.replace(/"([^"]*)"/g, '“$1”');
}

/** A mistake as one sentence to stand under its field, without the key path that a file's reader wants. */
export function sentenceOf(problem: Problem): string {
  const lead = `${problem.path}: `;
  const clause = problem.message.startsWith(lead) ? problem.message.slice(lead.length) : problem.message;
  const said = clause.startsWith('is missing') ? `This ${clause}` : clause;
  return `${withQuotes(said.charAt(0).toUpperCase() + said.slice(1))}.`;
}

/** The id of the element that holds a field's mistake, for the field to point to. */
export function errorId(path: string): string {
  return `wrong-${path.replaceAll('.', '-')}`;
}
