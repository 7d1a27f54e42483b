import { createServer } from 'node:net';
import { PlainError } from './plain-error.mjs';

/** Whether a program could listen there now; the error's code if not. */
function tryPort(host, port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', (error) => resolve({ code: error.code }));
    probe.listen({ host, port, exclusive: true }, () => {
      const { port: got } = probe.address();
      probe.close(() => resolve({ port: got }));
    });
  });
}

/** A free port on the loopback address; the one wished for if it is free. */
export async function freePort(wish = 0) {
  const tried = await tryPort('127.0.0.1', wish);
  return tried.port ?? freePort(0);
}

/** Reads PORT as a person may have typed it. @throws {PlainError} if it is no port. */
export function readPort(text) {
  if (text === undefined || text === '') return 3000;
  const port = Number(text);
  if (!/^\d+$/.test(text) || port > 65_535)
    throw new PlainError(
      `PORT must be a whole number from 0 to 65535, not "${text}". For example: PORT=3001 npm start`,
    );
  return port;
}

/** One clear sentence for an address that cannot be listened on. */
export function portProblem(code, host, port) {
  if (code === 'EADDRINUSE')
    return new PlainError(
      `Port ${port} is taken by another program. Choose another one: PORT=${port === 65_535 ? 3000 : port + 1} npm start`,
    );
  if (code === 'EACCES')
    return new PlainError(
      `This user may not listen on port ${port}. Choose one above 1023: PORT=3000 npm start`,
    );
  return new PlainError(
    `This machine has no address "${host}" to listen on (${code}). Leave HOST away for this machine only, or HOST=0.0.0.0 for everyone on the network.`,
  );
}

/** @throws {PlainError} if the address cannot be listened on. */
export async function requirePort(host, port) {
  const { code } = await tryPort(host, port);
  if (code) throw portProblem(code, host, port);
}
