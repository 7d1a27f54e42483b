/** One pass over an algorithm's text: every character is accounted for, or it is the error. */
import { FAMILIES, MOVES, type Move } from './moves.ts';

/** More than any last-layer algorithm has; keeps repeated repetitions from filling the memory. */
export const MOST_MOVES = 500;

/** The text is no algorithm. `column` counts from 1 and points at the first wrong character. */
export class AlgorithmSyntaxError extends Error {
  constructor(
    readonly column: number,
    /** The word that cannot be read, as written; empty at the end of the text. */
    readonly token: string,
    /** No move, a bracket without its partner, something only an expander reads, over 500 moves. */
    readonly reason: 'not-a-move' | 'unbalanced' | 'needs-expanding' | 'too-long',
  ) {
    super(`Character ${column} of the algorithm cannot be read${token === '' ? '' : `: ${token}`}.`);
    this.name = 'AlgorithmSyntaxError';
  }
}

type Bracket = '(' | '[';
interface Group {
  readonly bracket: Bracket;
  readonly at: number;
  /** Moves of the enclosing group before this one. */
  readonly lengthBefore: number;
  separators: number;
}

/** Number of the move family that a letter stands for, and of the wide that a face letter with w stands for. */
const FAMILY_OF = new Map<string, number>(FAMILIES.map((family, number) => [family, number]));
const WIDE_OF = new Map<string, number>(
  Array.from('ULFRBD', (face) => [face, FAMILY_OF.get(face.toLowerCase())!]),
);
/** Straight, curly, true prime, back tick, acute: what keyboards and word processors put there. */
const PRIMES = "'’′`´‘";
const BRACKETS = '()[],:';

const isPrime = (char: string): boolean => char !== '' && PRIMES.includes(char);
const isDigit = (char: string): boolean => char >= '0' && char <= '9';
const isSpace = (char: string): boolean => char === ' ' || /^\s$/u.test(char);

export class AlgorithmScanner {
  readonly moves: Move[] = [];
  /** First character that only an expander can read; −1 if there is none. */
  expandsAt = -1;
  private at = 0;
  /** Moves in the innermost open group, written out. */
  private length = 0;
  private readonly open: Group[] = [];
  /** Brackets and separators, each before the move of that number. */
  private readonly marks: { readonly before: number; readonly text: string }[] = [];

  constructor(private readonly text: string) {}

  /** @throws AlgorithmSyntaxError */
  scan(): void {
    while (this.at < this.text.length) {
      const char = this.text[this.at]!;
      if (char === '(' || char === '[') this.openGroup(char);
      else if (char === ')' || char === ']') this.closeGroup(char === ')' ? '(' : '[');
      else if (char === ',' || char === ':') this.separate(char);
      else if (isSpace(char)) this.at++;
      else this.readMove();
      if (this.length > MOST_MOVES) throw new AlgorithmSyntaxError(this.at, '', 'too-long');
    }
    const unclosed = this.open.at(-1);
    if (unclosed) throw new AlgorithmSyntaxError(unclosed.at + 1, unclosed.bracket, 'unbalanced');
  }

  /** The text in plain ASCII with its brackets, one space between words. */
  structured(): string {
    const words: string[] = [];
    let mark = 0;
    for (let move = 0; move <= this.moves.length; move++) {
      for (; this.marks[mark]?.before === move; mark++) words.push(this.marks[mark]!.text);
      if (move < this.moves.length) words.push(this.moves[move]!.text);
    }
    return words.join(' ');
  }

  private peek(): string {
    return this.text[this.at] ?? '';
  }

  /** The error at the current character, in a word that began at `start`. */
  private wrong(start: number): AlgorithmSyntaxError {
    let end = this.at;
    while (end < this.text.length && !isSpace(this.text[end]!) && !BRACKETS.includes(this.text[end]!)) end++;
    const token = this.text.slice(start, Math.max(end, this.at + 1));
    return new AlgorithmSyntaxError(this.at + 1, token, 'not-a-move');
  }

  private readMove(): void {
    const start = this.at;
    const letter = this.peek();
    let family = FAMILY_OF.get(letter);
    if (family === undefined) throw this.wrong(start);
    this.at++;
    if (this.peek() === 'w') {
      family = WIDE_OF.get(letter);
      if (family === undefined) throw this.wrong(start);
      this.at++;
    }
    let amount = 1;
    if (this.peek() === '2') {
      amount = 2;
      this.at++;
      // R2' is the same half turn, written by those who care which way the hand goes.
      if (isPrime(this.peek())) this.at++;
    } else if (isPrime(this.peek())) {
      amount = 3;
      this.at++;
    }
    if (isDigit(this.peek()) || isPrime(this.peek())) throw this.wrong(start);
    this.moves.push(MOVES[family * 3 + amount - 1]!);
    this.length++;
  }

  private mark(text: string): void {
    this.marks.push({ before: this.moves.length, text });
  }

  private openGroup(bracket: Bracket): void {
    if (bracket === '[' && this.expandsAt < 0) this.expandsAt = this.at;
    this.open.push({ bracket, at: this.at, lengthBefore: this.length, separators: 0 });
    this.mark(bracket);
    this.length = 0;
    this.at++;
  }

  private separate(char: ',' | ':'): void {
    const group = this.open.at(-1);
    if (group?.bracket !== '[' || group.separators > 0) throw this.wrong(this.at);
    group.separators++;
    this.mark(char);
    this.at++;
  }

  private closeGroup(bracket: Bracket): void {
    const group = this.open.pop();
    if (group?.bracket !== bracket) throw new AlgorithmSyntaxError(this.at + 1, this.peek(), 'unbalanced');
    if (bracket === '[' && group.separators === 0) throw this.wrong(this.at);
    const start = this.at++;
    const times = this.readTimes(start);
    const inverted = isPrime(this.peek());
    if (inverted) this.at++;
    if (isPrime(this.peek()) || isDigit(this.peek())) throw this.wrong(start);
    if ((times !== null || inverted) && this.expandsAt < 0) this.expandsAt = start + 1;
    this.mark((bracket === '(' ? ')' : ']') + (times ?? '') + (inverted ? "'" : ''));
    // [A, B] is A B A' B': twice what stands in it at most.
    this.length = group.lengthBefore + this.length * (bracket === '[' ? 2 : 1) * (times ?? 1);
  }

  /** A repetition of 1 to 999 behind a closing bracket, or null. */
  private readTimes(start: number): number | null {
    const first = this.at;
    if (this.peek() === '0') throw this.wrong(start);
    while (isDigit(this.peek())) {
      if (this.at - first === 3) throw this.wrong(start);
      this.at++;
    }
    return this.at === first ? null : Number(this.text.slice(first, this.at));
  }
}
