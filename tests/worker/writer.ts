import { hire, newCompany } from "../factories/company";

/** Hires people as fast as it can, and says who was hired and who was not, until long after the database came back. */
const HANDS = 6;
const AFTER_COMING_BACK = 60;

const company = await newCompany();
console.log(JSON.stringify({ company: company.companyId }));

let refused = 0;
let since = 0;

function refuse(error: unknown): void {
  refused++;
  console.log(JSON.stringify({ refused: error instanceof Error ? error.message : String(error) }));
}

async function hireUntilEnough(): Promise<void> {
  for (;;) {
    try {
      const { email } = await hire(company, "technician");
      console.log(JSON.stringify({ hired: email }));
      if (refused > 0) since++;
      if (since >= AFTER_COMING_BACK) process.exit(0);
    } catch (error) {
      refuse(error);
    }
  }
}

// The driver may throw past the promise when a connection dies as it writes: that hand hears nothing more.
process.on("uncaughtException", (error) => {
  refuse(error);
  void hireUntilEnough();
});
for (let hand = 0; hand < HANDS; hand++) void hireUntilEnough();
