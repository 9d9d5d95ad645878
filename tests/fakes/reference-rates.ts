import { createServer } from "node:http";
import type { AddressInfo } from "node:net";

/** What the fake answers: a status and a body. */
export interface RatesAnswer {
  status: number;
  body: string;
}

/** Invented rates of one day, in the form in which the European Central Bank publishes its own. */
export const INVENTED_RATES = `<?xml version="1.0" encoding="UTF-8"?>
<gesmes:Envelope xmlns:gesmes="http://www.gesmes.org/xml/2002-08-01" xmlns="http://www.ecb.int/vocabulary/2002-08-01/eurofxref">
<gesmes:subject>Reference rates</gesmes:subject>
<Cube><Cube time='2026-03-06'><Cube currency='USD' rate='1.25'/><Cube currency='GBP' rate='0.8'/><Cube currency='JPY' rate='160'/></Cube></Cube>
</gesmes:Envelope>`;

/** A small server that stands in for a bank's address of reference rates, for development and tests. */
export class FakeReferenceRates {
  answer: RatesAnswer = { status: 200, body: INVENTED_RATES };
  address = "";
  readonly #server = createServer((_, response) => {
    response.writeHead(this.answer.status, { "content-type": "text/xml" }).end(this.answer.body);
  });

  /** Listens on loopback; port 0 takes any free one. */
  async start(port = 0): Promise<this> {
    await new Promise<void>((done) => this.#server.listen(port, "127.0.0.1", done));
    this.address = `http://127.0.0.1:${(this.#server.address() as AddressInfo).port}/daily.xml`;
    return this;
  }

  async stop(): Promise<void> {
    await new Promise((done) => this.#server.close(done));
  }
}
