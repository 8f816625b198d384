import { Router } from 'express';
import { givenByName } from '../givenText.ts';
import { renderReport } from '../render/report.ts';
import { contentsPage } from './pages/contents.ts';
import { givenForm } from './pages/givenForm.ts';
import { SERVED_STYLE, topLine } from './pages/served.ts';
import { refuseOtherMethods } from './refuse.ts';
import { sendPage } from './sendPage.ts';
import { evaluateServed, type Serving } from './serving.ts';

/** The pages for a person: the list of sheets, and each sheet with its inputs to be changed. */
export function pages(serving: Serving): Router {
  const router = Router();

  router
    .route('/')
    .get((_request, response) => sendPage(response, contentsPage(serving)))
    .all(refuseOtherMethods('GET'));

  // An evaluation changes nothing on the server, so the inputs stand in the address and can be kept.
  router
    .route('/sheets/:name')
    .get(async ({ params: { name }, query }, response) => {
      const evaluation = await evaluateServed(serving, name, givenByName(pairsOf(query)));
      const page = renderReport(evaluation, { top: topLine(), given: givenForm(name), style: SERVED_STYLE });
      sendPage(response, page);
    })
    .all(refuseOtherMethods('GET'));

  router
    .route('/healthz')
    .get((_request, response) => {
      response.json({ status: 'ok' });
    })
    .all(refuseOtherMethods('GET'));

  // Browsers ask for one without being told to.
  router.get('/favicon.ico', (_request, response) => {
    response.status(204).end();
  });

  return router;
}

/** The simple reader of addresses gives a text for each name, or a list where the name stands twice. */
function pairsOf(query: object): [string, string][] {
  return Object.entries(query as Record<string, string | string[]>).flatMap(([name, texts]) =>
    [texts].flat().map((text): [string, string] => [name, text]),
  );
}
