/**
 * Tells a person what a command is doing: one line for each step, and for a step that takes over a second
 * also that it is under way and how far it is.
 */
export class Steps {
  #out;
  #live;

  /** @param {NodeJS.WriteStream} [out] A terminal gets a line that changes, anything else plain lines. */
  constructor(out = process.stdout) {
    this.#out = out;
    this.#live = Boolean(out.isTTY);
  }

  /** A line of its own. */
  line(text = '') {
    this.#out.write(`${text}\n`);
  }

  /**
   * Runs one step.
   * @template T
   * @param {string} name
   * @param {(progress: (percent: number | null, text: string) => void) => Promise<string | [string, T]>} work
   *   Gives what to print behind the name, with the step's result where it has one.
   * @returns {Promise<T>}
   */
  async run(name, work) {
    const began = performance.now();
    let doing = '';
    const seconds = () => (performance.now() - began) / 1000;
    const status = () => `  ${name} … ${Math.floor(seconds())} s${doing ? `, ${doing}` : ''}`;
    let told = '';
    let toldAt = 0;
    const tell = () => {
      if (this.#live) this.#out.write(`\r\x1b[K${status().slice(0, (this.#out.columns ?? 80) - 1)}`);
      // Without a terminal: once after a second, then at news, at most every two seconds, at least every ten.
      else if (!told || (doing !== told.slice(1) && seconds() - toldAt >= 2) || seconds() - toldAt >= 10) {
        told = `.${doing}`;
        toldAt = seconds();
        this.#out.write(`${status()}\n`);
      }
    };
    const timer = setInterval(() => seconds() >= 0.95 && tell(), this.#live ? 250 : 1000);
    try {
      const done = await work((percent, text) => {
        doing = percent === null ? text : `${Math.round(percent)} %${text ? `, ${text}` : ''}`;
      });
      const [text, result] = Array.isArray(done) ? done : [done, undefined];
      this.#clear();
      const took = seconds();
      this.line(`  ${name}: ${text}${took >= 1 ? ` (${took.toFixed(1)} s)` : ''}`);
      return result;
    } catch (error) {
      this.#clear();
      throw error;
    } finally {
      clearInterval(timer);
    }
  }

  #clear() {
    if (this.#live) this.#out.write('\r\x1b[K');
  }
}
