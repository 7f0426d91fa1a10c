import { Footing, Ladder, VerdictStrip } from '../ladder/index.ts';
import { Order } from '../order/Order.tsx';
import { Piece } from '../piece/index.ts';
import { confirmShown } from '../state/confirming.ts';
import { newVersion, otherTab } from '../state/network.ts';
import { notice } from '../state/notice.ts';
import { Stress } from '../stress/index.ts';
import { laterPart } from '../style/laterPart.ts';
import { Announcer } from './Announcer.tsx';
import { Foot } from './Foot.tsx';
import { fileOver } from './fileOver.ts';
import { Head } from './Head.tsx';
import { finderShown, keysShown } from './keys.ts';
import { TopBand } from './TopBand.tsx';

const dialogs = laterPart(async () => (await import('./Dialogs.tsx')).Dialogs);

const OpenDialogs = () => {
  const Dialogs = (keysShown.value || finderShown.value || confirmShown.value || fileOver.value) && dialogs.value;
  return Dialogs && <Dialogs />;
};

const notices = laterPart(async () => (await import('./Notices.tsx')).Notices);

const OpenNotices = () => {
  const Notices = (notice.value || otherTab.value || newVersion.value) && notices.value;
  return Notices && <Notices />;
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
      <OpenNotices />
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
  </>
);
