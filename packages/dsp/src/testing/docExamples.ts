/** One function that the package offers, with what its doc comment says and shows. */
export interface DocumentedFunction {
  readonly name: string;
  /** All that stands before the example. */
  readonly text: string;
  /** Code after `@example`; empty where there is none. */
  readonly example: string;
}

/** One statement of an example, and what the comment at its end says it gives. */
export interface ExampleStep {
  readonly code: string;
  readonly expected: string | null;
}

/** A doc comment and the exported function that follows it. */
const DOCUMENTED = /\/\*\*((?:(?!\*\/)[\s\S])*)\*\/\s*export (?:async )?function (\w+)/g;

/** @param source - text of a TypeScript file */
export function documentedFunctions(source: string): DocumentedFunction[] {
  return [...source.matchAll(DOCUMENTED)].map(([, comment, name]) => {
    const [text, example = ''] = comment.replace(/^\s*\* ?/gm, '').split(/^@example$/m);
    return { name, text: text.trim(), example: example.split(/^@/m)[0].trim() };
  });
}

/** A statement ends with a semicolon at the end of a line, or with a comment that says what it gives. */
export function exampleSteps(example: string): ExampleStep[] {
  const steps: ExampleStep[] = [];
  let lines: string[] = [];
  for (const line of example.split('\n').filter((text) => !text.startsWith('//'))) {
    const [, code, expected] = /^(.*?)(?:\s+\/\/ (.+))?$/.exec(line) ?? [];
    lines.push(code);
    if (expected === undefined && !code.endsWith(';')) continue;
    steps.push({ code: lines.join('\n'), expected: expected ?? null });
    lines = [];
  }
  return steps;
}
