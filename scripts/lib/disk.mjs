// @ts-check
import fs from 'node:fs';
import { Failure } from './failure.mjs';

const MB = 1024 * 1024;

/**
 * @param {string} folder an existing one
 * @returns {number} free space in MB for an ordinary user
 */
export function readFreeMb(folder) {
  const { bavail, bsize } = fs.statfsSync(folder);
  return Math.floor((bavail * bsize) / MB);
}

/**
 * @param {string} folder
 * @param {number} neededMb
 * @throws {Failure} when less is free
 */
export function assertRoomOnDisk(folder, neededMb) {
  const freeMb = readFreeMb(folder);
  if (freeMb < neededMb)
    throw new Failure(
      `The disk is almost full: ${freeMb} MB are free, Slingward needs ${neededMb} MB to start safely; free some space, then start again.`,
    );
}
