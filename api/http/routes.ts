import { exampleEnd } from '../exampleEnd.ts';
import { familyNames, getSections } from './getSections.ts';
import { getStandards } from './getStandards.ts';
import { openApi } from './openApi.ts';
import { postCard } from './postCard.ts';
import { postCheck } from './postCheck.ts';
import { postSheet } from './postSheet.ts';
import { json } from './reply.ts';
import type { Route } from './route.ts';

const taking = [400, 413, 415, 422] as const;

let description: ReturnType<typeof openApi> | undefined;

/** Every address of the API. */
export const routes: readonly Route[] = [
  {
    method: 'post',
    path: '/v1/check',
    summary: 'Checks one beam end, or one on each line; a line that cannot be checked is answered by a line of faults.',
    query: { working: ['0', '1'] },
    meaning: { working: '1 adds the working of every check' },
    takes: {
      'application/json': 'End',
      'application/x-ndjson': { lines: 'One End on each line, at most 8 MiB and 25000 lines in all' },
    },
    gives: {
      'application/json': 'Report',
      'application/x-ndjson': { lines: 'One Report or FaultLine for each line, in order' },
    },
    problems: taking,
    handler: postCheck,
  },
  {
    method: 'post',
    path: '/v1/sheet',
    summary: 'The sheet of one beam end for the job folder. The same end gives the same bytes.',
    query: { workings: ['governing', 'all'] },
    meaning: { workings: 'all adds pages with the working of every check' },
    takes: { 'application/json': 'End' },
    gives: { 'application/pdf': { other: 'The sheet' } },
    problems: taking,
    handler: postSheet,
  },
  {
    method: 'post',
    path: '/v1/card',
    summary:
      'The shop card of one fitting and setback: the reaction that each section carries with each count of bolt rows. The same card gives the same bytes.',
    query: { as: ['pdf', 'json'] },
    meaning: { as: 'json gives the table in place of the printed card' },
    takes: { 'application/json': 'CardRequest' },
    example: { end: exampleEnd, sections: ['UB 406x178x60', 'UB 457x191x67', 'UB 533x210x92'], rows: [2, 3, 4, 5] },
    gives: { 'application/pdf': { other: 'The card' }, 'application/json': 'Card' },
    problems: taking,
    handler: postCard,
  },
  {
    method: 'get',
    path: '/v1/sections',
    summary: 'The sections that an end can name, with their sizes.',
    query: { family: familyNames },
    meaning: { family: 'Only the sections of this family' },
    takes: {},
    gives: { 'application/json': 'Sections' },
    problems: [400],
    handler: getSections,
  },
  {
    method: 'get',
    path: '/v1/standards',
    summary: 'The design standards that an end can name, with their options and grades.',
    query: {},
    meaning: {},
    takes: {},
    gives: { 'application/json': 'Standards' },
    problems: [400],
    handler: getStandards,
  },
  {
    method: 'get',
    path: '/openapi.json',
    summary: 'This description.',
    query: {},
    meaning: {},
    takes: {},
    gives: { 'application/json': { other: 'OpenAPI 3.1' } },
    problems: [400],
    handler: () => {
      description ??= openApi(routes);
      return json(description);
    },
  },
];
