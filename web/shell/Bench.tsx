import { Footing, Ladder, VerdictStrip } from '../ladder/index.ts';
import { Order } from '../order/Order.tsx';
import { Announcer } from './Announcer.tsx';
import { DropPlace } from './DropPlace.tsx';
import { Foot } from './Foot.tsx';
import { Head } from './Head.tsx';
import { Later } from './Later.tsx';
import { Notices } from './Notices.tsx';
import { TopBand } from './TopBand.tsx';

const middle = async () => (await import('./Middle.tsx')).Middle;
const dialogs = async () => (await import('./Dialogs.tsx')).Dialogs;

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
          <Later load={middle} />
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
    <Later load={dialogs} />
    <DropPlace />
  </>
);
