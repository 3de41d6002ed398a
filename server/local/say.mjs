import { createInterface } from 'node:readline/promises';

/** A failure that is told in one sentence, without a stack. */
export class Sentence extends Error {}

/** @param {string} line */
export function say(line) {
  console.log(line);
}

/**
 * Runs a script's main function: its failures are sentences, and set the exit code.
 * @param {() => Promise<number | void>} main
 */
export async function runMain(main) {
  try {
    process.exitCode = (await main()) ?? 0;
  } catch (error) {
    console.error(error instanceof Sentence ? error.message : error);
    process.exitCode = 1;
  }
}

/**
 * @param {string} question
 * @param {boolean} yes whether it was answered on the command line
 */
export async function confirm(question, yes) {
  if (yes) return;
  if (!process.stdin.isTTY)
    throw new Sentence(`${question}\nNobody is here to answer: add --yes to agree.`);
  const terminal = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await terminal.question(`${question} Type yes to go on: `);
  terminal.close();
  if (answer.trim().toLowerCase() !== 'yes') throw new Sentence('Nothing was changed.');
}

/**
 * Splits a command line into the options it may have and the rest.
 * @param {readonly string[]} args
 * @param {readonly string[]} known
 * @param {number} most how many arguments that are not options may stand there
 */
export function readArguments(args, known, most) {
  const options = args.filter((each) => each.startsWith('--'));
  const rest = args.filter((each) => !each.startsWith('--'));
  const strange = options.find((each) => !known.includes(each)) ?? rest[most];
  if (strange !== undefined) {
    throw new Sentence(
      `What does ${strange} mean? Known here: ${known.join(', ') || 'no options'}.`,
    );
  }
  return { has: (/** @type {string} */ option) => options.includes(option), rest };
}
