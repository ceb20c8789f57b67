import { useState } from "react";
import { readScan } from "./read-scan";
import { ScanField } from "./scan-field";
import { useBurst } from "./use-burst";
import { useCamera } from "./use-camera";
import { Viewfinder } from "./viewfinder";

/**
 * Three ways to a vehicle: the camera, a scanner that types, the code by hand.
 * @param onCode a good code was read
 * @param onText something was scanned that may be one
 */
export function ScanDesk({
  typed,
  problem,
  onCode,
  onText,
}: {
  typed: string;
  problem: string | null;
  onCode: (code: string) => void;
  onText: (text: string) => void;
}) {
  const [stranger, setStranger] = useState<string | null>(null);
  const camera = useCamera((text) => {
    const scanned = readScan(text);
    if (!scanned.ok) {
      setStranger(scanned.words);
      return;
    }
    camera.stop();
    if (navigator.userActivation?.hasBeenActive) navigator.vibrate?.(60);
    onCode(scanned.code);
  });
  useBurst(onText);
  return (
    <main className="mx-auto grid w-full max-w-6xl gap-8 p-4 sm:p-6 lg:grid-cols-[minmax(0,1fr)_26rem] lg:gap-10">
      <div className="grid content-start gap-3">
        <h1 className="font-label font-semibold text-3xl">Scan a tag</h1>
        <Viewfinder
          state={camera.state}
          video={camera.video}
          stranger={stranger}
          onStart={() => {
            setStranger(null);
            camera.start();
          }}
          onStop={camera.stop}
        />
      </div>
      <div className="grid content-start gap-6 border-concrete-300 lg:border-l lg:pt-12 lg:pl-10">
        <ScanField typed={typed} problem={problem} focus />
        <dl className="grid gap-3 border-concrete-200 border-t pt-5 text-concrete-700">
          <div>
            <dt className="font-semibold text-ink">Nothing reads it?</dt>
            <dd>
              Wipe the tag, keep it flat, mind the lamp's glare. The code below the picture always works.
            </dd>
          </div>
          <div>
            <dt className="font-semibold text-ink">Torn or lost?</dt>
            <dd>Open the build from the Floor or the Counter and print the tag again.</dd>
          </div>
        </dl>
      </div>
    </main>
  );
}
