import { type KeyboardEvent, useId, useState } from "react";
import { Field } from "../../ui/field";

export type Customer = { id: number; name: string; phone: string; email: string };

const MOST_SHOWN = 7;

/** The customers whose name or number holds what was typed; those whose name begins with it first. */
export function matchCustomers(customers: readonly Customer[], typed: string): Customer[] {
  const needle = typed.trim().toLowerCase();
  if (needle === "") return customers.slice(0, MOST_SHOWN);
  const digits = needle.replace(/\D/g, "");
  const starts = (customer: Customer) => (customer.name.toLowerCase().startsWith(needle) ? 0 : 1);
  return customers
    .filter(
      ({ name, phone }) =>
        name.toLowerCase().includes(needle) ||
        (digits.length > 2 && phone.replace(/\D/g, "").includes(digits)),
    )
    .sort((a, b) => starts(a) - starts(b))
    .slice(0, MOST_SHOWN);
}

/** One field for whose vehicle it is: a name that is known is chosen from the list, any other is a new customer. */
export function CustomerPick({
  customers,
  typed,
  faults,
}: {
  customers: readonly Customer[];
  typed: Record<string, string>;
  faults: Record<string, string>;
}) {
  const listId = useId();
  const [name, setName] = useState(typed.customerName ?? "");
  const [chosenId, setChosenId] = useState(typed.customerId ?? "");
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const chosen = customers.find((customer) => String(customer.id) === chosenId);
  const found = open && !chosen ? matchCustomers(customers, name) : [];

  const choose = (customer: Customer) => {
    setChosenId(String(customer.id));
    setName(customer.name);
    setOpen(false);
    setActive(-1);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === "Escape") setOpen(false);
    if (event.key === "ArrowDown" || event.key === "ArrowUp") {
      event.preventDefault();
      setOpen(true);
      const step = event.key === "ArrowDown" ? 1 : -1;
      setActive((before) => (found.length === 0 ? -1 : (before + step + found.length) % found.length));
    }
    const picked = found[active];
    if (event.key === "Enter" && picked) {
      event.preventDefault();
      choose(picked);
    }
  };

  return (
    <div className="grid gap-4">
      <div className="relative">
        <input type="hidden" name="customerId" value={chosenId} />
        <Field
          label="Customer"
          name="customerName"
          value={name}
          autoComplete="off"
          maxLength={80}
          role="combobox"
          aria-expanded={found.length > 0}
          aria-controls={listId}
          aria-autocomplete="list"
          aria-activedescendant={found[active] ? `${listId}-${found[active].id}` : undefined}
          hint={
            chosen
              ? knownWords(chosen)
              : name.trim() === ""
                ? "A name; known customers are offered."
                : "A new customer."
          }
          error={faults.customerName ?? faults.customerId}
          onClick={() => setOpen(true)}
          onBlur={() => setOpen(false)}
          onKeyDown={onKeyDown}
          onChange={(event) => {
            setName(event.target.value);
            setChosenId("");
            setActive(-1);
            setOpen(true);
          }}
        />
        <div
          id={listId}
          role="listbox"
          aria-label="Known customers"
          hidden={found.length === 0}
          className="absolute inset-x-0 top-[4.5rem] z-10 border border-paint-edge bg-chalk shadow-lift"
        >
          {found.map((customer, index) => (
            <div
              key={customer.id}
              id={`${listId}-${customer.id}`}
              role="option"
              tabIndex={-1}
              aria-selected={index === active}
              className={`flex min-h-12 cursor-pointer items-center justify-between gap-4 px-3 ${index === active ? "bg-brass-wash" : "hover:bg-concrete-100"}`}
              // Pressing must not take the focus from the field, which would close the list before the click.
              onMouseDown={(event) => event.preventDefault()}
              onClick={() => choose(customer)}
              onKeyDown={() => {}}
            >
              <span className="font-semibold">{customer.name}</span>
              <span className="text-concrete-500">{customer.phone || customer.email}</span>
            </div>
          ))}
        </div>
      </div>
      {chosen ? null : (
        <div className="grid gap-4 sm:grid-cols-2">
          <Field
            label="Phone"
            name="customerPhone"
            type="tel"
            autoComplete="off"
            maxLength={40}
            defaultValue={typed.customerPhone}
            error={faults.customerPhone}
          />
          <Field
            label="E-mail"
            name="customerEmail"
            type="email"
            autoComplete="off"
            maxLength={190}
            defaultValue={typed.customerEmail}
            error={faults.customerEmail}
          />
        </div>
      )}
    </div>
  );
}

const knownWords = ({ phone, email }: Customer) =>
  `Known customer${phone || email ? `, ${phone || email}` : ""}.`;
