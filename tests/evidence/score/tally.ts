import type { Judged } from './compare-with-truth';

interface Counts {
  right: number;
  read: number;
  stated: number;
}

const percent = (share: number): string =>
  (Number.isFinite(share) ? (100 * share).toFixed(1) : '-').padStart(6);

/** What is counted over certificates. */
export class Tally {
  private readonly fields = new Map<string, Counts>();
  private readonly bins = new Map<number, { given: number; right: number; sum: number }>();
  private files = 0;
  private pages = 0;
  private milliseconds = 0;
  private planted = 0;
  private missed = 0;
  private alarms = 0;
  private lostCertificates = 0;

  field({ field, outcome }: Judged, confidence: number | null): void {
    const counts = this.fields.get(field) ?? { right: 0, read: 0, stated: 0 };
    counts.right += Number(outcome === 'right');
    counts.read += Number(outcome === 'right' || outcome === 'wrong' || outcome === 'invented');
    counts.stated += Number(outcome === 'right' || outcome === 'wrong' || outcome === 'missed');
    this.fields.set(field, counts);
    if (confidence === null || outcome === 'missed' || outcome === 'rightly_null') return;
    const bin = Math.min(9, Math.floor(confidence * 10 + 1e-9)) + (confidence >= 0.95 ? 0.5 : 0);
    const seen = this.bins.get(bin) ?? { given: 0, right: 0, sum: 0 };
    this.bins.set(bin, {
      given: seen.given + 1,
      right: seen.right + Number(outcome === 'right'),
      sum: seen.sum + confidence,
    });
  }

  seconds(milliseconds: number, pages: number): void {
    this.files += 1;
    this.milliseconds += milliseconds;
    this.pages += pages;
  }

  lost(): void {
    this.lostCertificates += 1;
  }

  discrepancies(planted: number, missed: number, alarms: number): void {
    this.planted += planted;
    this.missed += missed;
    this.alarms += alarms;
  }

  add(other: Tally): void {
    for (const [bin, { given, right, sum }] of other.bins) {
      const seen = this.bins.get(bin) ?? { given: 0, right: 0, sum: 0 };
      this.bins.set(bin, { given: seen.given + given, right: seen.right + right, sum: seen.sum + sum });
    }
  }

  print(title: string): void {
    console.log(`\n${title}: ${this.files} files, ${this.pages} pages`);
    console.log(`${'field'.padEnd(26)}precision recall     F1  stated`);
    const total: Counts = { right: 0, read: 0, stated: 0 };
    for (const [field, counts] of this.fields) {
      printCounts(field, counts);
      total.right += counts.right;
      total.read += counts.read;
      total.stated += counts.stated;
    }
    printCounts('all fields', total);
    const recall = (this.planted - this.missed) / this.planted;
    console.log(
      `discrepancies: ${this.planted} planted, recall ${percent(recall).trim()} %, false alarms ${(this.alarms / this.files).toFixed(3)} per certificate`,
    );
    if (this.lostCertificates > 0)
      console.log(`${this.lostCertificates} certificates were not found in their files`);
    console.log(`${(this.milliseconds / this.pages / 1000).toFixed(3)} seconds per page`);
  }

  printCalibration(): void {
    console.log('\nconfidence   facts   mean   right');
    for (const [bin, { given, right, sum }] of [...this.bins].sort(([a], [b]) => a - b))
      console.log(
        `${(bin / 10).toFixed(2)}…       ${String(given).padStart(6)} ${percent(sum / given)} ${percent(right / given)}`,
      );
  }
}

function printCounts(name: string, { right, read, stated }: Counts): void {
  const precision = right / read;
  const recall = right / stated;
  const f1 = (2 * right) / (read + stated);
  console.log(
    `${name.padEnd(26)}   ${percent(precision)} ${percent(recall)} ${percent(f1)}  ${String(stated).padStart(6)}`,
  );
}
