import type { Visitor } from '../visitor.js';

export type StreamEvent = { readonly type: string; readonly data: unknown };

/** Reads a stream of events as a phone does. `next` waits for one; null is the end of the stream. */
export class EventReader {
  private text = '';

  private constructor(
    private readonly reader: ReadableStreamDefaultReader<string>,
    private readonly controller: AbortController,
  ) {}

  static async open(url: string, { accessToken }: Visitor): Promise<EventReader> {
    const controller = new AbortController();
    const response = await fetch(`${url}/api/sync/notices`, {
      headers: { authorization: `Bearer ${accessToken}`, 'accept-encoding': 'gzip' },
      signal: controller.signal,
    });
    if (response.status !== 200) throw new Error(`no stream: ${response.status}`);
    return new EventReader(response.body!.pipeThrough(new TextDecoderStream()).getReader(), controller);
  }

  async next(): Promise<StreamEvent | null> {
    for (;;) {
      const end = this.text.indexOf('\n\n');
      const block = end < 0 ? '' : this.text.slice(0, end);
      if (end >= 0) this.text = this.text.slice(end + 2);
      const type = /^event: (.*)$/m.exec(block)?.[1];
      const data = /^data: (.*)$/m.exec(block)?.[1];
      if (type && data) return { type, data: JSON.parse(data) as unknown };
      if (end >= 0) continue;
      const { done, value } = await this.reader.read();
      if (done) return null;
      this.text += value;
    }
  }

  close(): void {
    this.controller.abort();
  }
}
