import { OtherWays } from '../ways/OtherWays.tsx';
import { Caution } from '../Caution.tsx';
import { usePourView } from '../pourView.ts';
import { StepFoot } from '../StepFoot.tsx';
import { BigTemperature } from '../wort/BigTemperature.tsx';
import { CoolantField } from '../wort/CoolantField.tsx';
import { CoolingPlot } from '../wort/CoolingPlot.tsx';
import { PourNow } from '../wort/PourNow.tsx';
import { ReadingEntry } from '../wort/ReadingEntry.tsx';
import { ReadingList } from '../wort/ReadingList.tsx';
import { ReadySignal } from '../wort/ReadySignal.tsx';
import { VerdictBox } from '../wort/VerdictBox.tsx';

/** The wort's temperature and the pour: the answer first and large, the reason next, the remedy last. */
export function WortStep() {
  const { batch, cakeOf, mine, standing } = usePourView();
  return (
    <>
      <div className="wide:grid wide:grid-cols-2 wide:gap-x-10">
        <div>
          <BigTemperature />
          <VerdictBox />
          <div className="wide:hidden">
            <CoolingPlot />
          </div>
          {mine && <ReadingEntry />}
          <PourNow />
        </div>
        <div>
          <div className="max-wide:hidden">
            <CoolingPlot />
          </div>
          {mine && (
            <div className="mt-4 flex flex-wrap items-end gap-x-4">
              <CoolantField />
              <ReadySignal />
            </div>
          )}
          <ReadingList />
        </div>
      </div>
      <Caution>
        Hot wort burns and kills yeast: keep hands, hoses and glass out of its way until it is cool.
      </Caution>
      <StepFoot />
      {mine && cakeOf && standing.linkHolds.length > 0 && (
        <OtherWays batch={batch} cakeOf={cakeOf} />
      )}
    </>
  );
}
