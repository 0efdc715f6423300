import { z } from 'zod';
import type { Operation } from '../operation';
import { deviceListSchema, deviceSchema, gateSchema } from '../shapes/device';

const named = (what: string) => z.string().min(1).max(200).describe(`Name or id of the ${what}`);

export const gateQuery = z.strictObject({ device: named('device'), version: named('firmware version') });

export const DEVICE_OPERATIONS: Operation[] = [
  {
    id: 'listDevices',
    method: 'get',
    path: '/devices',
    part: 'Devices',
    summary: 'List devices',
    about: 'By name, all at once. A device is there once a dataset names it.',
    scope: 'read',
    answer: {
      status: 200,
      about: 'The devices',
      content: { type: 'application/json', schema: deviceListSchema, about: 'Devices' }
    }
  },
  {
    id: 'readDevice',
    method: 'get',
    path: '/devices/{id}',
    part: 'Devices',
    summary: 'Read a device',
    about: 'Its firmware versions in order, and the rule of its gate.',
    scope: 'read',
    idOf: 'device',
    answer: {
      status: 200,
      about: 'The device',
      content: { type: 'application/json', schema: deviceSchema, about: 'A device' }
    }
  },
  {
    id: 'readGate',
    method: 'get',
    path: '/gate',
    part: 'Devices',
    summary: 'Ask whether a firmware version passes its gate',
    about:
      'Decided from the datasets as they stand now. While a diagnosis waits the outcome is undecided, and Retry-After says when to ask again.',
    scope: 'read',
    query: gateQuery,
    answer: {
      status: 200,
      about: 'The outcome, with the document behind it',
      content: { type: 'application/json', schema: gateSchema, about: 'severalty.gate/1 and its outcome' }
    },
    refusals: {
      404: 'The team has no such device, or the device no such firmware version.',
      409: 'The device has no rule yet, or there are no counts to judge.'
    }
  }
];
