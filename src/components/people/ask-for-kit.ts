/** Shows the choice of a kit while a co-builder is invited; other roles see every kit. */
export function askForKit(page: Document): void {
  const form = page.getElementById("invite");
  const field = page.getElementById("invite-kit-field");
  const choice = page.getElementById("invite-kit");
  if (!form || !field || !(choice instanceof HTMLSelectElement)) return;
  const settle = () => {
    const role = form.querySelector<HTMLInputElement>('input[name="role"]:checked')?.value;
    field.hidden = role !== "co-builder";
    if (field.hidden) choice.value = "";
  };
  form.addEventListener("change", settle);
  settle();
}
