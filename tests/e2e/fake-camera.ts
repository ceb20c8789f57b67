import { writeFileSync } from "node:fs";
import sharp from "sharp";

const WIDTH = 640;
const HEIGHT = 480;
const FRAMES = 30;

/**
 * Makes the picture that a camera sees: a screenshot of a printed page, held a little askew before a grey wall.
 * Written as raw video (Y4M, I420), which Chromium plays as its fake camera.
 */
export async function filmPage(screenshot: Buffer, file: string): Promise<void> {
  const page = await sharp(screenshot)
    .flatten({ background: "#fff" })
    .rotate(4, { background: "#8a8a86" })
    .resize(WIDTH, HEIGHT, { fit: "contain", background: "#8a8a86" })
    .greyscale()
    .raw()
    .toBuffer();
  const luma = page.subarray(0, WIDTH * HEIGHT);
  const chroma = Buffer.alloc((WIDTH * HEIGHT) / 2, 128);
  const parts: Buffer[] = [Buffer.from(`YUV4MPEG2 W${WIDTH} H${HEIGHT} F30:1 Ip A1:1 C420jpeg\n`)];
  for (let i = 0; i < FRAMES; i++) parts.push(Buffer.from("FRAME\n"), luma, chroma);
  writeFileSync(file, Buffer.concat(parts));
}
