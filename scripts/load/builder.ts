import { setTimeout as wait } from 'node:timers/promises';
import { defaultDesign, type Design } from '../../geometry';
import type { DesignFiles, DesignRecord } from '../../lib/schemas/api';
import type { Client } from './client';

/** Mean pause of a person between two things they do, ms. */
const PAUSE = 3_000;

/** Air gaps that a save chooses from, mm: each save is another design, derived in full. */
const gapOf = (number: number, save: number): number =>
  0.5 + ((number * 37 + save * 11) % 400) / 1000;

/** A builder at work on one design: looks, opens, saves, downloads; and what they know of it. */
export class Builder {
  private id = '';
  private version = 0;
  private saves = 0;
  /** Name under which the last save was answered. */
  private acknowledged = '';
  readonly faults: string[] = [];

  constructor(
    private readonly number: number,
    private readonly client: Client,
    private readonly random: () => number,
  ) {}

  private nameOf(save: number): string {
    return `Bench ${this.number}, save ${save}`;
  }

  private design(save: number): Design {
    const design = defaultDesign();
    const [section] = design.sections;
    return { ...design, sections: [{ ...section!, airGap: gapOf(this.number, save) }] };
  }

  private fault(what: string): void {
    this.faults.push(`builder ${this.number}: ${what}`);
  }

  async begin(): Promise<void> {
    const name = this.nameOf(0);
    const { status, body } = await this.client.insist('create', '/api/designs', 'POST', {
      name,
      design: this.design(0),
    });
    if (status !== 201) throw new Error(`no design could be made: ${status}`);
    this.acknowledged = name;
    ({ id: this.id, version: this.version } = body as DesignRecord);
  }

  private async save(): Promise<void> {
    const save = ++this.saves;
    const name = this.nameOf(save);
    const change = { version: this.version, name, design: this.design(save) };
    const path = `/api/designs/${this.id}`;
    const { status, body } = await this.client.insist('save', path, 'PUT', change);
    if (status === 200) {
      this.version = (body as DesignRecord).version;
      this.acknowledged = name;
      return;
    }
    // The save before a crash may have been made and its answer lost: then it is ours.
    const { current } = body as { current?: DesignRecord };
    if (status === 409 && current?.name === name) {
      this.version = current.version;
      this.acknowledged = name;
    } else this.fault(`save ${save} answered ${status}`);
  }

  private async download(): Promise<void> {
    const { status, body } = await this.client.ask('files', `/api/designs/${this.id}/files`);
    if (status !== 200) return;
    const { files } = body as DesignFiles;
    const file = files[Math.floor(this.random() * files.length)]!;
    await this.client.ask(
      'download',
      `/api/designs/${this.id}/files/${encodeURIComponent(file.name)}`,
    );
  }

  /** Works until `over`. */
  async work(over: () => boolean): Promise<void> {
    await wait(this.random() * PAUSE);
    while (!over()) {
      const chance = this.random();
      if (chance < 0.4) await this.client.ask('list', '/api/designs');
      else if (chance < 0.75) await this.client.ask('open', `/api/designs/${this.id}`);
      else if (chance < 0.95) await this.save();
      else await this.download();
      await wait(PAUSE * (0.5 + this.random()));
    }
  }

  /** Is what is stored what was answered last, with every save before it? */
  async check(history: (id: string) => Promise<readonly number[]>): Promise<void> {
    const { body } = await this.client.insist('open', `/api/designs/${this.id}`, 'GET');
    const stored = body as DesignRecord;
    if (stored.name !== this.acknowledged || stored.version !== this.version) {
      this.fault(`stored is ${stored.name}, answered was ${this.acknowledged}`);
    }
    const gap = stored.design.sections[0]!.airGap;
    const save = Number(/save (\d+)$/.exec(stored.name)?.[1]);
    if (gap !== gapOf(this.number, save)) this.fault(`half saved: ${stored.name} with ${gap}`);
    const versions = await history(this.id);
    if (
      versions.some((version, at) => version !== at + 1) ||
      versions.length !== stored.version
    )
      this.fault(`versions kept are ${versions.join(' ')}`);
  }
}
