import { createApp } from '../../api/app.ts';

const app = createApp();

export const JSON_TYPE = 'application/json';
export const LINES_TYPE = 'application/x-ndjson';

/** Sends a body to the API without a network between. */
export const post = async (path: string, body: BodyInit, type = JSON_TYPE): Promise<Response> =>
  app.request(path, { method: 'POST', body, headers: { 'content-type': type } });

export const postJson = (path: string, value: unknown): Promise<Response> => post(path, JSON.stringify(value));

export const ask = async (path: string, init?: RequestInit): Promise<Response> => app.request(path, init);
