import { NotAcceptableException } from '@nestjs/common';

/** 406 with the media types that are offered. */
export class NotAcceptableProblem extends NotAcceptableException {
  constructor(offered: readonly string[]) {
    super({ message: `This is offered as ${offered.join(', ')}.`, offered });
  }
}
