import type { Invoice } from '../../api/billing';
import { formatDay } from '../../components/formatDay';
import { Table } from '../../components/Table';
import styles from './Billing.module.css';
import { moneyText } from './moneyText';

const STATUS_WORDS: Partial<Record<string, string>> = {
  open: 'to be paid',
  uncollectible: 'given up',
  void: 'withdrawn',
};

/** What was charged, the newest first. */
export function Invoices({ invoices }: { invoices: readonly Invoice[] }) {
  if (invoices.length === 0) return null;
  return (
    <section className={styles.section} aria-labelledby="invoices">
      <h2 id="invoices">Invoices</h2>
      <Table className={styles.table} aria-labelledby="invoices">
        <thead>
          <tr>
            <th scope="col">Number</th>
            <th scope="col">Date</th>
            <th scope="col">State</th>
            <th scope="col">Amount</th>
          </tr>
        </thead>
        <tbody>
          {invoices.map((invoice) => (
            <InvoiceRow key={invoice.id} invoice={invoice} />
          ))}
        </tbody>
      </Table>
    </section>
  );
}

function InvoiceRow({ invoice }: { invoice: Invoice }) {
  const { number, createdAt, status, url } = invoice;
  const name = number ?? 'without a number';
  return (
    <tr>
      <td>
        {url === null ? (
          name
        ) : (
          <a href={url} target="_blank" rel="noreferrer">
            {name}
          </a>
        )}
      </td>
      <td>{formatDay(createdAt)}</td>
      <td className={status === 'open' ? styles.open : undefined}>{STATUS_WORDS[status] ?? status}</td>
      <td>{moneyText(invoice)}</td>
    </tr>
  );
}
