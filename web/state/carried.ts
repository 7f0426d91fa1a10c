import { later } from './later.ts';
import { refuse } from './notice.ts';

type Carry = typeof import('./carry.ts');

const load = (): Promise<Carry> => import('./carry.ts');

// Fetched once the page stands: browsers give the clipboard and files only to what follows a press at once.
later(load);

/** Does something with what carries ends to and from files, links and sheets, which is loaded when it is first wanted. */
export const carried = async (act: (carry: Carry) => unknown): Promise<void> => {
  let carry: Carry;
  try {
    carry = await load();
  } catch {
    refuse('This part of the program could not be loaded. Try again once there is a network.');
    return;
  }
  await act(carry);
};
