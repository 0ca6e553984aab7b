import { useEffect, useRef, useState, type ReactNode } from 'react';
import { useHandheldScanner } from '../../../lib/handheldScanner';
import { playScanTone, unlockSounds } from '../../../lib/sounds';
import { useLabelReader } from '../hooks/useLabelReader';
import { useReading } from '../hooks/useReading';
import { understand, wayOfAddress, type ReadWay, type Refusal, type Understood } from '../reading';
import { createRepeatGuard } from '../repeatGuard';
import { CameraView } from './CameraView';
import { CodeForm } from './CodeForm';
import { PhotoReader } from './PhotoReader';
import { RefusalNotice } from './RefusalNotice';
import { ScanResult } from './ScanResult';

/**
 * All ways to read a label, one answer at a time: while it stands, the camera waits; a handheld scanner's next code
 * takes its place, because who pulls the trigger means it.
 * @param addressCode what came with `?code=`
 */
export function ScanStation({ addressCode }: { addressCode: string | null }): ReactNode {
  const reader = useLabelReader();
  const { reading, setReading } = useReading();
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const [guard] = useState(createRepeatGuard);

  const answer = (understood: Understood): void => {
    if (understood.ok) {
      setRefusal(null);
      setReading(understood.reading);
    } else {
      setRefusal(understood.refusal);
      setReading(null);
      playScanTone('unknown');
    }
  };
  const take = (text: string, via: ReadWay): void => answer(understand(text, via, Date.now()));
  const takeFromCamera = (text: string): void => {
    if (reading) return;
    const understood = understand(text, 'camera', Date.now());
    if (guard.isNew(understood.ok ? understood.reading.code : text, performance.now())) answer(understood);
  };
  const scanNext = (): void => {
    if (reading) guard.settle(reading.code, performance.now());
    setReading(null);
  };

  useHandheldScanner((text) => take(text, 'scanner'));
  const takeAddress = useRef(take);
  useEffect(() => {
    takeAddress.current = take;
  });
  useEffect(() => {
    if (addressCode) takeAddress.current(addressCode, wayOfAddress(addressCode));
  }, [addressCode]);

  return (
    <div onPointerDown={unlockSounds}>
      {reading && <ScanResult key={reading.readAt} reading={reading} onNext={scanNext} />}
      <div className={reading ? 'hidden' : 'lg:grid lg:grid-cols-[3fr_2fr] lg:items-start lg:gap-8'}>
        <div className="-mx-4 -mt-7 sm:-mx-6 lg:mx-0 lg:mt-0">
          <CameraView
            reader={reader}
            isPaused={reading !== null || addressCode !== null}
            onRead={takeFromCamera}
          />
        </div>
        <div className="flex flex-col gap-6 pt-4 lg:pt-0">
          {refusal && <RefusalNotice refusal={refusal} onDismiss={() => setRefusal(null)} />}
          <CodeForm onCode={(text) => take(text, 'typed')} />
          <PhotoReader reader={reader.reader} onRead={(text) => take(text, 'photo')} />
          <p className="text-muted">
            A handheld scanner works on this page and on every other: point it at the label and pull the
            trigger.
          </p>
        </div>
      </div>
    </div>
  );
}
