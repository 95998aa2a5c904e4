import { Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In } from 'typeorm';
import { cachedBatch } from '../common/cached-batch.js';
import { type Page } from '../common/graphql/connection.js';
import { type Outcome, accepted, problem, refused } from '../common/problem.js';
import { type SubstanceRef } from '../substances/substance.input.js';
import { SubstancesService } from '../substances/substances.service.js';
import { GasPair } from './gas-pair.entity.js';

const PAIRS_REMEMBERED = 5_000;

@Injectable()
export class PairsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly substances: SubstancesService,
  ) {}

  /** Batch function for `loaderFor`: one entry per id, in the order asked. A pair never changes, so it is remembered. */
  readonly byIds = cachedBatch<GasPair>({ max: PAIRS_REMEMBERED }, async (ids) => {
    const found = await this.dataSource.getRepository(GasPair).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((pair) => [pair.id, pair]));
    return ids.map((id) => byId.get(id) ?? new Error(`no pair ${id}`));
  });

  /** The pair of two substances in either order, or null. */
  async find(a: SubstanceRef, b: SubstanceRef): Promise<GasPair | null> {
    const [first, second] = [await this.substances.find(a), await this.substances.find(b)];
    if (!first || !second) return null;
    return this.findByIds(this.dataSource.manager, first.id, second.id);
  }

  findById(id: string, manager: EntityManager = this.dataSource.manager): Promise<GasPair | null> {
    return manager.findOneBy(GasPair, { id });
  }

  /** All pairs by the names of their substances, those with measurements or a sheet. */
  async list(search: string | null | undefined, page: Page): Promise<[GasPair[], number]> {
    const words = (search ?? '')
      .toLowerCase()
      .split(/[\s+,]+/)
      .filter(Boolean);
    const query = this.dataSource
      .getRepository(GasPair)
      .createQueryBuilder('p')
      .innerJoin('substances', 'a', 'a.id = p.first_id')
      .innerJoin('substances', 'b', 'b.id = p.second_id')
      .orderBy('lower(a.name)')
      .addOrderBy('lower(b.name)');
    words.forEach((word, i) => {
      const part = `%${word.replace(/[\\%_]/g, (character) => `\\${character}`)}%`;
      query.andWhere(
        `(lower(a.name || ' ' || a.formula || ' ' || array_to_string(a.synonyms, ' ') || ' ' || coalesce(a.cas_number, '')
          || ' ' || b.name || ' ' || b.formula || ' ' || array_to_string(b.synonyms, ' ') || ' ' || coalesce(b.cas_number, '')) LIKE :part${i})`,
        { [`part${i}`]: part },
      );
    });
    const count = await query.getCount();
    return [await query.offset(page.offset).limit(page.limit).getMany(), count];
  }

  /** The pair of two substances, made when it is not there yet. The first named stands first where it is displayed. */
  async findOrCreate(tx: EntityManager, a: SubstanceRef, b: SubstanceRef): Promise<Outcome<GasPair>> {
    const [first, second] = [await this.substances.find(a, tx), await this.substances.find(b, tx)];
    if (!first) return refused(problem('BAD_INPUT', 'No such substance is in the library.', 'a'));
    if (!second) return refused(problem('BAD_INPUT', 'No such substance is in the library.', 'b'));
    if (first.id === second.id) return refused(problem('BAD_INPUT', 'A gas pair has two different substances.', 'b'));
    await tx.query('INSERT INTO gas_pairs (first_id, second_id) VALUES ($1, $2) ON CONFLICT DO NOTHING', [
      first.id,
      second.id,
    ]);
    const pair = await this.findByIds(tx, first.id, second.id);
    if (!pair) throw new Error('the pair just made is not there');
    return accepted(pair);
  }

  private findByIds(manager: EntityManager, first: string, second: string): Promise<GasPair | null> {
    return manager.findOneBy(GasPair, [
      { firstId: first, secondId: second },
      { firstId: second, secondId: first },
    ]);
  }
}
