import { z } from 'zod';
import { check } from './cli/check.ts';
import { BadInput, print, recordOf, textOf } from './cli/input.ts';
import { verify } from './cli/verify.ts';

const usage = `buckram COMMAND …; FILE may be - for standard input

  schema                                    the record as JSON Schema
  rules                                     every check with why, source and examples
  check FILE [--fail-on LEVEL]              flags of a record, or of many, one a line
  draft FILE [--letter KIND] [--docx OUT]   statements of the note or a letter
  codes FILE                                proposed codes with their reasons
  numbers FILE                              every figure that follows from a record
  compute NAME KEY=VALUE …                  one formula; without NAME, the list
  read RECORD TEXT                          words of a text file that a record denies
  verify FILE                               a proof exported from the application
`;

type Command = (args: string[]) => number | Promise<number>;

const commands: Readonly<Record<string, Command>> = {
  schema: async () => {
    const { caseRecord } = await import('../src/domain/record/schema.ts');
    print(z.toJSONSchema(caseRecord, { io: 'input' }));
    return 0;
  },
  rules: async () => {
    const { rules } = await import('../src/domain/checks/registry.ts');
    print(rules.map(({ check: _, ...rule }) => rule));
    return 0;
  },
  check,
  draft: async (args) => (await import('./cli/draft.ts')).draft(args),
  codes: async (args) => {
    const { proposeCodes } = await import('../src/domain/coding/propose.ts');
    const { notice } = await import('../src/domain/coding/code-sets.ts');
    print({ ...proposeCodes(recordOf(args[0])), notice });
    return 0;
  },
  numbers: async (args) => {
    const { numbersOf } = await import('../src/domain/physics/numbers.ts');
    print(numbersOf(recordOf(args[0])));
    return 0;
  },
  compute: async ([name, ...pairs]) => {
    const { compute, formulas } = await import('../src/domain/physics/formulas.ts');
    if (name === undefined) {
      print(Object.entries(formulas).map(([id, { compute: _, ...formula }]) => ({ name: id, ...formula })));
      return 0;
    }
    const given = pairs.map((pair) => {
      const at = pair.indexOf('=');
      if (at < 1) throw new BadInput(`write ${pair} as KEY=VALUE`);
      return [pair.slice(0, at), pair.slice(at + 1)] as const;
    });
    const answer = compute(name, Object.fromEntries(given));
    if (!answer.ok) throw new BadInput(answer.error.message);
    print(answer.value);
    return 0;
  },
  read: async (args) => {
    const { readProse } = await import('../src/domain/prose/read.ts');
    print(readProse(textOf(args[1]), recordOf(args[0])));
    return 0;
  },
  verify,
};

const main = async ([name, ...args]: string[]): Promise<number> => {
  if (name === undefined || name === 'help' || name === '--help') {
    process.stdout.write(usage);
    return name === undefined ? 2 : 0;
  }
  const command = Object.hasOwn(commands, name) ? commands[name] : undefined;
  if (command === undefined)
    throw new BadInput(`there is no command ${name}; there are ${Object.keys(commands).join(', ')}`);
  return command(args);
};

try {
  process.exitCode = await main(process.argv.slice(2));
} catch (error) {
  if (!(error instanceof BadInput)) throw error;
  process.stderr.write(`buckram: ${error.message}\n`);
  process.exitCode = 2;
}
