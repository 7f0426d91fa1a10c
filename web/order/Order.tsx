import { Assumed } from './Assumed.tsx';
import { BeamLine } from './BeamLine.tsx';
import { BoltsLine } from './BoltsLine.tsx';
import { CutLine } from './CutLine.tsx';
import { FaultList } from './FaultList.tsx';
import { JointLine } from './JointLine.tsx';
import { LoadLine } from './LoadLine.tsx';
import { SheetLine } from './SheetLine.tsx';
import { StandardLine } from './StandardLine.tsx';

/** The end as an order: five sentences that open in place, then the standard, the sheet, and what is assumed. */
export const Order = () => (
  <section class="bench-order" id="order" tabIndex={-1} aria-labelledby="order-title">
    <h2 id="order-title">Order</h2>
    <FaultList />
    <ol class="order">
      <BeamLine />
      <CutLine />
      <BoltsLine />
      <JointLine />
      <LoadLine />
    </ol>
    <Assumed />
    <ol class="order also">
      <StandardLine />
      <SheetLine />
    </ol>
  </section>
);
