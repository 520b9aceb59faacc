import { readFile } from "node:fs/promises";
import { z } from "zod";
import { startingProfile } from "@/domain/settings/starting-profile";
import { startingProfileRequestSchema } from "@/domain/settings/starting-profile-request";

/** A refusal of the input, said in one message that names the field. */
class RefusedInput extends Error {}

function pathText(path: ReadonlyArray<PropertyKey>): string {
  return path.map(String).join(".");
}

/**
 * The answers to an array of starting-profile requests, in their order.
 *
 * @param json text of the file
 * @throws {RefusedInput} naming the request (from 0) and the field at fault
 */
function answersTo(json: string): unknown[] {
  let requests: unknown;
  try {
    requests = JSON.parse(json);
  } catch (error) {
    throw new RefusedInput(`not JSON: ${error instanceof Error ? error.message : String(error)}`);
  }
  const parsed = z.array(startingProfileRequestSchema).safeParse(requests);
  if (parsed.success) return parsed.data.map(startingProfile);
  const lines = parsed.error.issues.map(({ path: [request, ...field], message }) =>
    request === undefined ? `an array of requests: ${message}` : `request ${String(request)}: ${pathText(field)}: ${message}`,
  );
  throw new RefusedInput(lines.join("\n"));
}

/**
 * `verify -- profile INPUTS.json`: reads an array of starting-profile requests and
 * prints a JSON array of answers. A file that cannot be read or a request that is
 * not valid ends with exit code 1 and a message on stderr; nothing is printed then.
 */
export async function run(args: string[]): Promise<void> {
  const [file] = args;
  try {
    if (file === undefined) throw new RefusedInput("usage: verify -- profile INPUTS.json");
    const json = await readFile(file, "utf8").catch((error: unknown) => {
      throw new RefusedInput(error instanceof Error ? error.message : String(error));
    });
    process.stdout.write(`${JSON.stringify(answersTo(json), null, 2)}\n`);
  } catch (error) {
    if (!(error instanceof RefusedInput)) throw error;
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
  }
}
