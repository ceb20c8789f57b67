import { BarcodeDetector, prepareZXingModule } from "barcode-detector/ponyfill";
import wasmUrl from "zxing-wasm/reader/zxing_reader.wasm?url";

let prepared = false;

/** Makes a reader of QR pictures. Loaded only when a camera is used: it is a megabyte of WebAssembly of our own. */
export function makeReader(): (video: HTMLVideoElement) => Promise<string | null> {
  if (!prepared) {
    prepareZXingModule({
      overrides: {
        locateFile: (path: string, prefix: string) => (path.endsWith(".wasm") ? wasmUrl : prefix + path),
      },
    });
    prepared = true;
  }
  const detector = new BarcodeDetector({ formats: ["qr_code"] });
  return async (video) => {
    const [found] = await detector.detect(video);
    return found?.rawValue ?? null;
  };
}
