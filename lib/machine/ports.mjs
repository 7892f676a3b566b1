// Free TCP ports on this machine, for servers that give way when their usual port is taken.
import net from 'node:net'

import { Problem } from './problem.mjs'

const WINDOW = 200

function canListen(port, host) {
  return new Promise((resolve) => {
    const server = net.createServer()
    // A machine without IPv6 has nothing there that could be in the way.
    server.once('error', (error) => resolve(error.code === 'EADDRNOTAVAIL' || error.code === 'EAFNOSUPPORT'))
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)))
  })
}

/** Asks both families: `localhost` may lead a browser to ::1 first, and to somebody else's server. */
async function isPortFree(port) {
  return (await canListen(port, '127.0.0.1')) && (await canListen(port, '::1'))
}

/** The preferred port or the next free one; a port once given out is not given out again by this process. */
export async function pickPort(preferred, given = new Set()) {
  for (let port = preferred; port < preferred + WINDOW; port += 1) {
    if (!given.has(port) && (await isPortFree(port))) {
      given.add(port)
      return port
    }
  }
  throw new Problem(`No free port between ${preferred} and ${preferred + WINDOW - 1}.`)
}
