import { register } from "node:module";

/**
 * Preloaded into every process that runs our TypeScript outside Next (migrations, demo, worker, benchmarks).
 *
 * The package "server-only" throws unless it is loaded under the condition "react-server", which Next sets. Setting
 * that condition ourselves is no way out: under it React refuses to draw letters ("react-dom/server is not
 * supported"). So here, where there is no browser to protect from, the marker resolves to an empty module.
 */
const hook = `
export const resolve = (specifier, context, next) =>
  specifier === "server-only" ? { url: "data:text/javascript,", shortCircuit: true } : next(specifier, context);
`;

register(`data:text/javascript,${encodeURIComponent(hook)}`);
