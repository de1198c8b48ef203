import { VERSION } from "../export/index.ts";
import { columnCommand } from "./column-command.ts";
import { compareCommand } from "./compare-command.ts";
import { EXIT, type ExitCode, type Host, UsageError } from "./host.ts";
import { inspectCommand } from "./inspect-command.ts";
import { USAGE } from "./usage.ts";
import { waterCommand } from "./water-command.ts";

const COMMANDS: Readonly<Record<string, (host: Host, args: readonly string[]) => Promise<ExitCode>>> = {
  column: columnCommand,
  compare: compareCommand,
  water: waterCommand,
  inspect: inspectCommand,
};

/** Runs one command line and returns the exit status; only a fault of the program itself rejects. */
export async function run(host: Host, args: readonly string[]): Promise<ExitCode> {
  const [name = "", ...rest] = args;
  if (name === "--help" || name === "-h") {
    host.out(USAGE);
    return EXIT.done;
  }
  if (name === "--version") {
    host.out(`layerhead ${VERSION}\n`);
    return EXIT.done;
  }
  try {
    const command = Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : undefined;
    if (!command) throw new UsageError(name === "" ? "no command given" : `${name}: no such command`);
    return await command(host, rest);
  } catch (error) {
    if (!isUsageError(error)) throw error;
    const help = Object.hasOwn(COMMANDS, name) ? `layerhead ${name} --help` : "layerhead --help";
    host.err(`layerhead: ${error.message.replace(/\s*\n\s*/g, " ")}; see ${help}\n`);
    return EXIT.badUsage;
  }
}

/** Ours, or one of node:util's parseArgs. */
const isUsageError = (error: unknown): error is Error =>
  error instanceof UsageError ||
  (error instanceof Error && "code" in error && String(error.code).startsWith("ERR_PARSE_ARGS"));
