// Asks now and then whether there is something newer than this page, and loads it.
(() => {
  const own = document.currentScript.dataset.version;
  const ask = async () => {
    try {
      const answer = await fetch("/-/version", { cache: "no-store" });
      if (answer.ok && (await answer.text()) !== own) {
        location.reload();
        return;
      }
    } catch {
      // The program has ended: the page stays as it is, and goes on when there is one again.
    }
    setTimeout(ask, 500);
  };
  setTimeout(ask, 500);
})();
