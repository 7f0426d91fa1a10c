import { Footing, Ladder, VerdictStrip } from '../ladder/index.ts';
import { Order } from '../order/Order.tsx';
import { Piece } from '../piece/index.ts';
import { confirmShown } from '../state/confirming.ts';
import { later } from '../state/later.ts';
import { Stress } from '../stress/index.ts';
import { Announcer } from './Announcer.tsx';
import { DropPlace } from './DropPlace.tsx';
import { Foot } from './Foot.tsx';
import { Head } from './Head.tsx';
import { finderShown, keysShown } from './keys.ts';
import { Notices } from './Notices.tsx';
import { TopBand } from './TopBand.tsx';

const dialogs = later(async () => (await import('./Dialogs.tsx')).Dialogs);

const OpenDialogs = () => {
  const Dialogs = (keysShown.value || finderShown.value || confirmShown.value) && dialogs.value;
  return Dialogs && <Dialogs />;
};

/** The bench: order, piece and ladder under one head. */
export const Bench = () => (
  <>
    <a class="skip-link" href="#order">
      To the order
    </a>
    <TopBand />
    <main>
      <Head />
      <Notices />
      <div class="bench">
        <Order />
        <div class="bench-middle">
          <Piece />
          <Stress />
        </div>
        <div class="bench-right">
          <Ladder />
          <Footing />
        </div>
      </div>
    </main>
    <Foot />
    <VerdictStrip />
    <Announcer />
    <OpenDialogs />
    <DropPlace />
  </>
);
