const kinds = ["refuse", "delay", "drop"];

/**
 * Troubles ordered for the coming messages to one address (or to all), each for so many messages:
 * `refuse` answers 451; `delay` keeps the message and says so only after `seconds`; `drop` keeps it and cuts the line.
 */
export class Faults {
  #ordered = [];

  order({ kind, to, times = 1, seconds = 5 }) {
    if (!kinds.includes(kind)) throw new RangeError(`kind must be one of ${kinds.join(", ")}`);
    this.#ordered.push({ kind, to: to?.toLowerCase(), times, seconds });
  }

  list() {
    return this.#ordered;
  }

  clear() {
    this.#ordered = [];
  }

  next(recipients) {
    const fault = this.#ordered.find(({ to }) => !to || recipients.some((r) => r.toLowerCase() === to));
    if (fault && --fault.times === 0) this.#ordered.splice(this.#ordered.indexOf(fault), 1);
    return fault;
  }
}
