import { Footing, Ladder, VerdictStrip } from '../ladder/index.ts';
import { Order } from '../order/Order.tsx';
import { Piece } from '../piece/index.ts';
import { Announcer } from './Announcer.tsx';
import { DropPlace } from './DropPlace.tsx';
import { FieldFinder } from './FieldFinder.tsx';
import { Foot } from './Foot.tsx';
import { Head } from './Head.tsx';
import { Keys } from './Keys.tsx';
import { Notices } from './Notices.tsx';
import { TopBand } from './TopBand.tsx';

/** The bench: order, piece and ladder under one head. */
export const Bench = () => (
  <>
    <a class="skip-link" href="#order">
      To the order
    </a>
    <TopBand />
    <Head />
    <Notices />
    <main class="bench">
      <Order />
      <div class="bench-middle">
        <Piece />
      </div>
      <div class="bench-right">
        <Ladder />
        <Footing />
      </div>
    </main>
    <Foot />
    <VerdictStrip />
    <Announcer />
    <FieldFinder />
    <Keys />
    <DropPlace />
  </>
);
