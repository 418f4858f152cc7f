/** Runs in the page before its own code: the device's clock shows so much more than the true time. */
export function shiftClock(aheadMs: number): void {
  const TrueDate = Date;
  const now = (): number => TrueDate.now() + aheadMs;
  globalThis.Date = new Proxy(TrueDate, {
    construct: (target, args) =>
      args.length === 0 ? new target(now()) : (Reflect.construct(target, args) as Date),
    apply: () => new TrueDate(now()).toString(),
    get: (target, name) => (name === 'now' ? now : (Reflect.get(target, name) as unknown)),
  });
}
