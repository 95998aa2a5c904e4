import { Injectable } from '@nestjs/common';
import { DataSource, EntityManager, In, QueryFailedError } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { cachedBatch } from '../common/cached-batch.js';
import { isId } from '../common/graphql/node.js';
import { type Page } from '../common/graphql/connection.js';
import { accepted, type Outcome, problem, refused } from '../common/problem.js';
import { type Viewer } from '../common/viewer.js';
import { substanceProblems } from './substance-rules.js';
import { Substance } from './substance.entity.js';
import { type SubstanceInput, type SubstanceRef, type UpdateSubstanceInput } from './substance.input.js';

/** PostgreSQL's SQLSTATE for a broken unique constraint. */
const UNIQUE_VIOLATION = '23505';

const SUBSTANCES_REMEMBERED = 2_000;
/** How long another process's change may go unseen, ms. */
const TRUSTED_MS = 1_000;

/** Lower rank first: exact names before beginnings before the rest. */
const RANK = `CASE
  WHEN lower(s.name) = :exact OR lower(s.formula) = :exact OR s.cas_number = :exact THEN 0
  WHEN EXISTS (SELECT FROM unnest(s.synonyms) synonym WHERE lower(synonym) = :exact) THEN 1
  WHEN lower(s.name) LIKE :beginning THEN 2
  ELSE 3 END`;

const MATCH = `(lower(s.name) LIKE :part OR lower(s.formula) = :exact OR s.cas_number LIKE :beginning
  OR EXISTS (SELECT FROM unnest(s.synonyms) synonym WHERE lower(synonym) LIKE :part))`;

function escapeLike(text: string): string {
  return text.replace(/[\\%_]/g, (character) => `\\${character}`);
}

@Injectable()
export class SubstancesService {
  constructor(private readonly dataSource: DataSource) {}

  /** Batch function for `loaderFor`: one entry per id, in the order asked. */
  readonly byIds = cachedBatch<Substance>({ max: SUBSTANCES_REMEMBERED, ttl: TRUSTED_MS }, async (ids) => {
    const found = await this.dataSource.getRepository(Substance).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((substance) => [substance.id, substance]));
    return ids.map((id) => byId.get(id) ?? new Error(`no substance ${id}`));
  });

  /** Substances by name, synonym, formula or CAS RN, best match first; all by name without a search. */
  async search(search: string | null | undefined, page: Page): Promise<[Substance[], number]> {
    const query = this.dataSource.getRepository(Substance).createQueryBuilder('s');
    const exact = search?.trim().toLowerCase();
    if (exact) {
      const escaped = escapeLike(exact);
      query
        .where(MATCH, { exact, part: `%${escaped}%`, beginning: `${escaped}%` })
        .addSelect(RANK, 'rank')
        .orderBy('rank')
        .addOrderBy('lower(s.name)');
    } else {
      query.orderBy('lower(s.name)');
    }
    const count = await query.getCount();
    const rows = await query.offset(page.offset).limit(page.limit).getMany();
    return [rows, count];
  }

  /** The substance that `ref` names, or null. A name is taken before a formula, a formula before a synonym. */
  async find(ref: SubstanceRef, manager: EntityManager = this.dataSource.manager): Promise<Substance | null> {
    const substances = manager.getRepository(Substance);
    if (ref.id !== undefined) return isId(ref.id) ? substances.findOneBy({ id: ref.id }) : null;
    if (ref.casNumber !== undefined) return substances.findOneBy({ casNumber: ref.casNumber.trim() });
    const exact = (ref.name ?? '').trim().toLowerCase();
    return substances
      .createQueryBuilder('s')
      .where(
        'lower(s.name) = :exact OR lower(s.formula) = :exact OR EXISTS (SELECT FROM unnest(s.synonyms) synonym WHERE lower(synonym) = :exact)',
        { exact },
      )
      .addSelect('CASE WHEN lower(s.name) = :exact THEN 0 WHEN lower(s.formula) = :exact THEN 1 ELSE 2 END', 'rank')
      .orderBy('rank')
      .addOrderBy('lower(s.name)')
      .limit(1)
      .getOne();
  }

  async create(input: SubstanceInput, viewer: Viewer): Promise<Outcome<Substance>> {
    const problems = substanceProblems(input);
    if (problems.length > 0) return refused(...problems);
    return this.keep(async () => {
      const substances = this.dataSource.getRepository(Substance);
      const { id } = await substances.save(substances.create({ ...fieldsOf(input), createdById: viewer.id }));
      return substances.findOneByOrFail({ id });
    });
  }

  /** @throws {ApiError} NOT_FOUND, or CONFLICT when somebody changed it meanwhile */
  async update(input: UpdateSubstanceInput): Promise<Outcome<Substance>> {
    const problems = substanceProblems(input);
    if (problems.length > 0) return refused(...problems);
    const outcome = await this.keep(() =>
      this.dataSource.transaction(async (tx) => {
        const lock = { mode: 'pessimistic_write' } as const;
        const substance = isId(input.id) ? await tx.findOne(Substance, { where: { id: input.id }, lock }) : null;
        if (!substance) throw new ApiError('NOT_FOUND', 'There is no such substance.');
        if (substance.lockVersion !== input.lockVersion) {
          throw new ApiError(
            'CONFLICT',
            'Somebody else changed this substance meanwhile. Load it again and repeat your change.',
          );
        }
        return tx.save(Object.assign(substance, fieldsOf(input)));
      }),
    );
    this.byIds.forget(input.id);
    return outcome;
  }

  private async keep(write: () => Promise<Substance>): Promise<Outcome<Substance>> {
    try {
      return accepted(await write());
    } catch (error) {
      if (!(error instanceof QueryFailedError)) throw error;
      const { code, constraint } = error.driverError as { code?: string; constraint?: string };
      if (code !== UNIQUE_VIOLATION) throw error;
      const isCas = constraint === 'uq_substances_cas_number';
      return refused(
        problem(
          'DUPLICATE',
          `There is a substance with this ${isCas ? 'CAS RN' : 'name'} already.`,
          isCas ? 'casNumber' : 'name',
        ),
      );
    }
  }
}

function fieldsOf(input: SubstanceInput): Partial<Substance> {
  return {
    name: input.name.trim(),
    formula: input.formula.trim(),
    synonyms: (input.synonyms ?? []).map((synonym) => synonym.trim()).filter((synonym) => synonym !== ''),
    casNumber: input.casNumber?.trim() || null,
    inchi: input.inchi?.trim() || null,
    molarMass: input.molarMass,
    constants: (input.constants ?? []).map((constant) => ({
      kind: constant.kind,
      value: constant.value ?? null,
      form: constant.form ?? null,
      coefficients: constant.coefficients ?? [],
      unit: constant.unit,
      temperatureMinimum: constant.temperatureMinimum ?? null,
      temperatureMaximum: constant.temperatureMaximum ?? null,
      relativeUncertainty: constant.relativeUncertainty ?? null,
      source: constant.source,
      note: constant.note ?? null,
    })),
  };
}
