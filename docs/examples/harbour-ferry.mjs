// An ammonia cracker feeds the fuel cell of a harbour ferry. The ferry "Tern", its cracker and every operating figure
// are invented; the chemistry and the species data are real.
import {
  formatLedger,
  formatQuantity,
  formatReactionTable,
  ledger,
  quantity,
  reaction,
  reactionDirection,
  reactionGibbsEnergy,
  temperaturesAtGibbsEnergy,
} from "gibbs-ledger";
import { H2O_g, referenceData } from "gibbs-ledger/data";
import { idealGas, virial } from "gibbs-ledger/fugacity";

const cracking = reaction("2 NH3(g) = N2(g) + 3 H2(g)", referenceData);

// Outlet of the first catalyst bed of the "Tern", with a little steam that takes no part (invented figures).
const pressure = quantity(60, "bar");
const moleFractions = { "NH3(g)": 0.56, "N2(g)": 0.1075, "H2(g)": 0.3225, "H2O(g)": 0.01 };
const bedOutlet = {
  temperature: quantity(352, "Cel"),
  pressure,
  gas: { moleFractions, equationOfState: virial() },
  inerts: [H2O_g],
};

print("The ammonia cracker of the harbour ferry Tern (invented plant, real data)");

print("\n1. The ledger: where the Gibbs energy at the bed outlet comes from\n");
print(formatLedger(ledger(cracking, bedOutlet)));

print("\n2. The equilibrium constant over temperature\n");
const temperatures = [500, 550, 600, 650, 700, 750, 800].map((kelvin) => quantity(kelvin, "K"));
print(formatReactionTable(cracking, { temperatures }));

print("\n3. Which way, at the composition of the bed outlet\n");
const { direction, reason } = reactionDirection(cracking, bedOutlet);
print(`The reaction runs ${direction}: ${reason}.`);
const real = reactionGibbsEnergy(cracking, bedOutlet);
const ideal = reactionGibbsEnergy(cracking, { ...bedOutlet, gas: { moleFractions, equationOfState: idealGas() } });
print(`as a real gas:   ${formatQuantity(real, { significantDigits: 5 })} (virial equation)`);
print(`as an ideal gas: ${formatQuantity(ideal, { significantDigits: 5 })}`);

print("\n4. Where it turns\n");
const between = [quantity(400, "K"), quantity(900, "K")];
const { temperature: _held, ...conditions } = bedOutlet;
const cases = [
  ["pure gases at 1 bar", { between }],
  ["the bed outlet, ideal gas", { between, conditions: { ...conditions, gas: { moleFractions } } }],
  ["the bed outlet, real gas", { between, conditions }],
];
for (const [name, search] of cases) {
  const turns = temperaturesAtGibbsEnergy(cracking, search);
  const found = turns.map((turn) => formatQuantity(turn, { digits: 2 }));
  print(`${name}: ${found.length === 0 ? "nowhere between 400 K and 900 K" : found.join(", ")}`);
}

function print(text) {
  console.log(text);
}
