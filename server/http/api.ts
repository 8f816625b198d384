import { type Request, type Response, Router } from 'express';
import { catalogue } from '../../functions/catalogue.ts';
import type { Workbook } from '../workbook/model.ts';
import { jsonBody, readEvaluationRequest } from './body.ts';
import { functionData } from './functionData.ts';
import { refuseOtherMethods } from './refuse.ts';
import { evaluateServed, type Serving } from './serving.ts';

/** The requests of programs: JSON for JSON. */
export function api(serving: Serving): Router {
  const { workbooks, ownFunctions } = serving;
  const router = Router();

  router
    .route('/workbooks')
    .get((_request, response) => {
      response.json({ workbooks: [...workbooks].map(([name, workbook]) => workbookData(name, workbook)) });
    })
    .all(refuseOtherMethods('GET'));

  router
    .route('/functions')
    .get((_request, response) => {
      const entries = [...catalogue, ...(ownFunctions?.functions ?? [])];
      response.json({ functions: entries.map(functionData) });
    })
    .all(refuseOtherMethods('GET'));

  router
    .route('/evaluate')
    .post(jsonBody, async (request: Request, response: Response) => {
      const { workbook, inputs } = readEvaluationRequest(request.body);
      response.json(await evaluateServed(serving, workbook, inputs));
    })
    .all(refuseOtherMethods('POST'));

  return router;
}

function workbookData(name: string, { title, about, sha256, inputs, outputs }: Workbook) {
  return { name, title, about, sha256, inputs, outputs };
}
