// Ports: taken ones are found before anything is started.
import net from "node:net";

/**
 * Reads a port from the environment.
 * @param {string} variable
 * @param {number} fallback
 */
export function portFrom(variable, fallback) {
  const port = Number(process.env[variable] ?? fallback);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Error(`${variable} must be a port number from 1 to 65535, not "${process.env[variable]}"`);
  }
  return port;
}

/**
 * Throws one line for each port somebody else listens on, naming the variable that moves it.
 * @param {{ what: string, variable: string, port: number, host: string }[]} wanted
 */
export async function requirePorts(wanted) {
  const complaints = [];
  for (const [index, { what, variable, port, host }] of wanted.entries()) {
    const isTwice = wanted.slice(0, index).some((other) => other.port === port);
    const reason = isTwice ? "wanted twice" : await refusal(port, host);
    if (reason)
      complaints.push(`Port ${port} for the ${what} is ${reason}. Choose another: ${variable}=${port + 10} npm start`);
  }
  if (complaints.length > 0) throw new Error(complaints.join("\n"));
}

/** @param {number} port @param {string} host @returns {Promise<string | undefined>} */
function refusal(port, host) {
  return new Promise((resolve) => {
    const probe = net.createServer();
    probe.once("error", (error) => {
      const code = "code" in error ? error.code : "";
      resolve(code === "EADDRINUSE" ? "in use" : code === "EACCES" ? "reserved for root" : error.message);
    });
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(undefined)));
  });
}
