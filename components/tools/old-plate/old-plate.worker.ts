import { createEdgeCache, type Design, type Path, type Point } from '@/geometry';
import { lawOfPlate, type OldStack, type PlateLaw } from '@/geometry/old-plate/plate-law';
import { vaneOf } from '@/geometry/old-plate/vane';
import { failureOf, type JobMessage } from '@/components/tools/job/messages';

export interface PlateQuestion {
  readonly design: Design;
  readonly section: number;
  readonly plate: Path;
  readonly centre: Point;
  readonly direction: 1 | -1;
  readonly stack: OldStack;
}

export interface PlateAnswer {
  readonly law: PlateLaw;
  /** Bearing of the leading edge in the drawing, and width of the blade, rad. */
  readonly leading: number;
  readonly sector: number;
}

const send = (message: JobMessage<PlateAnswer>): void => postMessage(message);

addEventListener('message', ({ data }: MessageEvent<PlateQuestion>) => {
  try {
    const { design, section, plate, centre, direction, stack } = data;
    const { blade, leading } = vaneOf(plate, centre, stack.cutoutRadius, direction);
    const law = lawOfPlate(design, section, blade, stack, createEdgeCache());
    send({ answer: { law, leading, sector: blade.sector } });
  } catch (error) {
    send(failureOf(error));
  }
});
