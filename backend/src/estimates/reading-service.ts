import { gzipSync } from 'node:zlib';
import { readEstimate } from '#shared/estimates/estimates-endpoints';
import type { Audience } from '#shared/actor/role';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import type { Figures } from '#shared/estimates/figures';
import { PreparedAnswer } from '../platform/http/answer';
import { presentEstimate } from './estimate-presenter';
import type { ReadingRepository } from './reading-repository';
import type { WholeEstimate } from './whole-estimate';

const readers = ['cost', 'price', 'bench'] as const;

/** The bytes an audience is sent, checked against its closed schema. */
function bytesFor(whole: WholeEstimate, figures: Figures, audience: (typeof readers)[number]): Buffer {
  const answer = readEstimate.answers[audience].parse(presentEstimate(whole, figures, audience));
  return gzipSync(JSON.stringify(answer));
}

/** What readers are sent of an estimate, made when it is saved, so that reading costs one row. */
export class ReadingService {
  constructor(private readonly readings: ReadingRepository) {}

  async keep(whole: WholeEstimate, figures: Figures): Promise<void> {
    const { workshopId, id, version } = whole.estimate;
    const rows = readers.map((audience) => ({
      ...{ id, audience, version, calculatorVersion },
      bytes: bytesFor(whole, figures, audience),
    }));
    await this.readings.put(workshopId, rows);
  }

  forget(workshopId: string, id: string): Promise<void> {
    return this.readings.forget(workshopId, id);
  }

  /** The kept bytes, unless another calculator made them. */
  async find(workshopId: string, id: string, audience: Audience): Promise<PreparedAnswer | undefined> {
    const row = await this.readings.find(workshopId, id, audience);
    return row?.calculatorVersion === calculatorVersion ? new PreparedAnswer(row.bytes, row.version) : undefined;
  }
}
