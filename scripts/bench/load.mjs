import autocannon from "autocannon";

/** Load on one address, in a process of its own so that it can have a core of its own. Prints requests a second and p99. */
const { url, body, seconds, connections } = JSON.parse(process.argv[2]);
const result = await autocannon({ url, method: "POST", headers: { "content-type": "application/json" }, body: JSON.stringify(body), duration: seconds, connections, timeout: 20 });
console.log(JSON.stringify({ perSecond: result["2xx"] / result.duration, p99: result.latency.p99, failed: result.non2xx + result.errors }));
