// One process of the bench: node measure.mjs CASE. Rounds of subject and reference alternate, each of some
// milliseconds, so that both see the same state of the machine; ratios are taken round by round.
import { median } from "./median.mjs";

const roundMilliseconds = 4;
const warmUpRounds = 40;
const rounds = 101;

const { note, prepare } = await import(`./cases/${process.argv[2]}.mjs`);
const { subject, reference, perCall, referencePerCall = perCall } = prepare();

// The same answer from both, or the comparison means nothing.
const [answer, referenceAnswer] = [subject(), reference()];
if (!(Math.abs(answer - referenceAnswer) <= 1e-9 * Math.abs(referenceAnswer))) {
  throw new Error(`the subject gives ${answer}, the reference ${referenceAnswer}`);
}

let sum = 0;
const runSubject = timer(subject, perCall);
const runReference = timer(reference, referencePerCall);
const times = [];
for (let round = -warmUpRounds; round < rounds; round += 1) {
  const subjectFirst = round % 2 === 0;
  const first = subjectFirst ? runSubject() : runReference();
  const second = subjectFirst ? runReference() : runSubject();
  if (round >= 0) times.push(subjectFirst ? [first, second] : [second, first]);
}
const figures = {
  nanoseconds: median(times.map(([own]) => own)),
  reference: median(times.map(([, other]) => other)),
  ratio: median(times.map(([own, other]) => own / other)),
  note,
  sum,
};
console.log(JSON.stringify(figures));

/** A function that runs one round and returns the nanoseconds per item, of which one call handles `items`. */
function timer(run, items) {
  let calls = 1;
  while (nanosecondsOf(run, calls) < roundMilliseconds * 1e6) calls *= 2;
  return () => nanosecondsOf(run, calls) / (calls * items);
}

function nanosecondsOf(run, calls) {
  const start = process.hrtime.bigint();
  for (let call = 0; call < calls; call += 1) sum += run();
  return Number(process.hrtime.bigint() - start);
}
