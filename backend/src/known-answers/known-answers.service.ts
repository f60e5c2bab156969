import { Injectable } from '@nestjs/common';
import type { KnownAnswers } from '@bellgap/common/api';
import { KNOWN_ANSWERS, LEFT_OUT, METHOD_EDITION, runKnownAnswer } from '@bellgap/common/engine';

/** Runs the published examples with the engine of this server, so that anybody can see its digits beside the print. */
@Injectable()
export class KnownAnswersService {
  run(): KnownAnswers {
    const items = Object.entries(KNOWN_ANSWERS).flatMap(([topic, examples]) =>
      examples.map((example, index): KnownAnswers['items'][number] => {
        const figures = runKnownAnswer(example);
        return {
          id: `${topic} ${index + 1}`,
          topic,
          title: example.title,
          source: example.source,
          status: example.status ?? 'seen',
          figures,
          why: example.why,
          verdict: figures.every(({ met }) => met) ? 'met' : 'missed',
        };
      }),
    );
    return { methodEdition: METHOD_EDITION, items, leftOut: [...LEFT_OUT] };
  }
}
