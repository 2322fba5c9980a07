// Runs before the first paint, as a file because the content policy allows no inline script.
try {
  const choice = localStorage.getItem("linkwright.theme");
  if (choice === "light" || choice === "dark") document.documentElement.dataset.theme = choice;
} catch {
  // Storage may be forbidden; the system's scheme then stands.
}
