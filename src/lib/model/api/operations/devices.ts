import { z } from 'zod';
import type { Operation } from '../operation';
import { deviceListSchema, deviceSchema, gateRuleSchema, gateSchema, newRuleSchema } from '../shapes/device';

const named = (what: string) => z.string().min(1).max(200).describe(`Name or id of the ${what}`);

export const gateQuery = z.strictObject({ device: named('device'), version: named('firmware version') });

export const ruleQuery = z.strictObject({ device: named('device') });

const ruleContent = { type: 'application/json', schema: gateRuleSchema, about: 'The rule' };

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
      'Decided from the datasets as they stand now. While a diagnosis waits the outcome is undecided, or failed where the counts of any group fail already; Retry-After says when to ask again.',
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
  },
  {
    id: 'readGateBadge',
    method: 'get',
    path: '/gate/badge.svg',
    part: 'Devices',
    summary: 'Take the gate of a version as a badge',
    about: 'Its name, a sign and the word, as the gate stands now.',
    scope: 'read',
    query: gateQuery,
    answer: {
      status: 200,
      about: 'The badge',
      content: { type: 'image/svg+xml', schema: null, about: 'SVG' }
    },
    refusals: { 404: 'The team has no such device, or the device no such firmware version.' }
  },
  {
    id: 'readGateRule',
    method: 'get',
    path: '/gate/rule',
    part: 'Devices',
    summary: 'Read the rule of a gate',
    scope: 'read',
    query: ruleQuery,
    answer: { status: 200, about: 'The rule', content: ruleContent },
    refusals: {
      404: 'The team has no such device.',
      409: 'The device has no rule yet.'
    }
  },
  {
    id: 'setGateRule',
    method: 'put',
    path: '/gate/rule',
    part: 'Devices',
    summary: 'Set the rule of a gate',
    about: 'In place of the rule that stands. The rule that stands already, sent again, changes nothing.',
    scope: 'edit',
    query: ruleQuery,
    bodies: [
      {
        type: 'application/json',
        schema: newRuleSchema,
        about: 'The reference by name or id; what is left out is as usual.',
        example: { reference: 'ebb 3.1', tolerance: 0.1, alpha: 0.05, groups: null }
      }
    ],
    answer: { status: 200, about: 'Set', content: ruleContent },
    refusals: {
      400: 'The body is not JSON, or did not arrive whole.',
      404: 'The team has no such device.',
      409: 'Somebody set another rule in this very moment.',
      413: 'More than the server takes.',
      415: 'Not application/json.',
      422: 'A field does not fit, the device has no version of that name for a reference, or no dataset of it names one of the groups.'
    }
  }
];
