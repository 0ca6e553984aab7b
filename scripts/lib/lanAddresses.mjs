// @ts-check
import os from 'node:os';
import { Failure } from './failure.mjs';

/** Networks inside this machine (containers, virtual machines): no phone reaches them. */
const INNER_NETWORK = /^(docker|br-|veth|virbr|vmnet|vboxnet|lxc|lxd|cni|flannel|tun|tap|wg)/;

/**
 * @param {NodeJS.Dict<os.NetworkInterfaceInfo[]>} [interfaces]
 * @returns {string[]} this machine's IPv4 addresses in the local network, the likeliest first
 * @throws {Failure} when there is none
 */
export function getLanAddresses(interfaces = os.networkInterfaces()) {
  const found = Object.entries(interfaces).flatMap(([name, addresses = []]) =>
    addresses
      .filter(
        ({ family, internal, address }) => family === 'IPv4' && !internal && !address.startsWith('169.254.'),
      )
      .map(({ address }) => ({ address, isInner: INNER_NETWORK.test(name) })),
  );
  if (found.length === 0)
    throw new Failure(
      'This machine has no address in a local network: connect it to the network the phones use, then start again.',
    );
  return found.sort((a, b) => Number(a.isInner) - Number(b.isInner)).map(({ address }) => address);
}
