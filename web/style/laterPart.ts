/// <reference types="vite/client" />
import { type Later, later } from '../state/later.ts';
import address from './opened.css?url';

let inForce: Promise<void> | undefined;

/** Puts the styles of what opens in force, once. Where they could not be loaded, the next asking tries again. */
const opened = (): Promise<void> => {
  inForce ??= new Promise<void>((done, failed) => {
    const link = document.createElement('link');
    link.rel = 'stylesheet';
    link.href = address;
    link.onload = () => done();
    link.onerror = () => {
      link.remove();
      inForce = undefined;
      failed(new Error(address));
    };
    document.head.append(link);
  });
  return inForce;
};

/** A part of the page that opens after the first view. It waits for its styles too, so that it never stands without them. */
export const laterPart = <T>(load: () => Promise<T>): Later<T> =>
  later(async () => {
    const [part] = await Promise.all([load(), opened()]);
    return part;
  });
