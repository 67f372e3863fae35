import { hire, newCompany } from "../factories/company";

/** Hires people as fast as it can, says who was hired and who was not, until told the database has come back. */
const HANDS = 6;
const AFTER_COMING_BACK = 60;

const company = await newCompany();
console.log(JSON.stringify({ company: company.companyId }));

let refused = 0;
let since = 0;
async function hireUntilEnough(): Promise<void> {
  while (refused === 0 || since < AFTER_COMING_BACK) {
    try {
      const { email } = await hire(company, "technician");
      if (refused > 0) since++;
      console.log(JSON.stringify({ hired: email }));
    } catch (error) {
      refused++;
      console.log(JSON.stringify({ refused: error instanceof Error ? error.message : String(error) }));
    }
  }
}
await Promise.all(Array.from({ length: HANDS }, hireUntilEnough));
process.exit(0);
