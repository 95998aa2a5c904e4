/** What an example asks for. */
export interface ExampleRequest {
  /** `https://sheets.example` */
  readonly origin: string;
  readonly code: string;
  readonly number: string;
  /** K */
  readonly temperatures: readonly number[];
  /** Pa */
  readonly pressure: number;
}

export const LANGUAGES = ['curl', 'Python', 'JavaScript', 'MATLAB'] as const;
export type Language = (typeof LANGUAGES)[number];

/** The one query of all examples; the sheet at hand comes in as variables. */
export const EXAMPLE_QUERY = `query ($code: String!, $number: String!, $T: FloatColumn!, $P: FloatColumn!) {
  dataSheet(code: $code) {
    version(number: $number) {
      status
      contentHash
      correlation {
        evaluate(temperatures: $T, pressures: $P, outsideRange: REFUSE) {
          diffusivities
          expandedUncertainties
          coverageFactor
        }
      }
    }
  }
}`;

const oneLine = EXAMPLE_QUERY.replace(/\s+/g, ' ');
const variables = ({ code, number, temperatures, pressure }: ExampleRequest) =>
  `{ "code": "${code}", "number": "${number}", "T": [${temperatures.join(', ')}], "P": [${pressure}] }`;

const curl = (example: ExampleRequest): string => `# K and Pa in, m²/s out
curl -sS ${example.origin}/graphql --data @- \\
  -H "Content-Type: application/json" -H "Authorization: Bearer $DIFFOLIO_KEY" <<'END'
{ "query": "${oneLine}",
  "variables": ${variables(example)} }
END`;

const python = (example: ExampleRequest): string => `import json, os, urllib.request

query = """${EXAMPLE_QUERY}"""
variables = ${variables(example)}

request = urllib.request.Request("${example.origin}/graphql",
    data=json.dumps({"query": query, "variables": variables}).encode(),
    headers={"Content-Type": "application/json", "Authorization": "Bearer " + os.environ["DIFFOLIO_KEY"]})
with urllib.request.urlopen(request, timeout=30) as response:
    answer = json.load(response)
if "errors" in answer:
    raise SystemExit(answer["errors"][0]["message"])

version = answer["data"]["dataSheet"]["version"]
assert version["status"] == "RELEASED", version["status"]  # superseded or withdrawn: decide, do not drift
print(version["correlation"]["evaluate"]["diffusivities"])  # m²/s`;

const javascript = (example: ExampleRequest): string => `const query = \`${EXAMPLE_QUERY}\`;
const variables = ${variables(example)};

const response = await fetch("${example.origin}/graphql", {
  method: "POST",
  headers: { "Content-Type": "application/json", Authorization: \`Bearer \${process.env.DIFFOLIO_KEY}\` },
  body: JSON.stringify({ query, variables }),
});
const { data, errors } = await response.json();
if (errors) throw new Error(errors[0].message);

const { status, correlation } = data.dataSheet.version;
if (status !== "RELEASED") throw new Error(status); // superseded or withdrawn: decide, do not drift
console.log(correlation.evaluate.diffusivities); // m²/s`;

const matlab = (example: ExampleRequest): string => `query = ['${oneLine.replaceAll("'", "''")}'];
variables = struct('code', '${example.code}', 'number', '${example.number}', ...
    'T', [${example.temperatures.join(' ')}], 'P', {{${example.pressure}}});
options = weboptions('MediaType', 'application/json', 'Timeout', 30, ...
    'HeaderFields', {'Authorization', ['Bearer ' getenv('DIFFOLIO_KEY')]});
answer = webwrite('${example.origin}/graphql', struct('query', query, 'variables', variables), options);

version = answer.data.dataSheet.version;
assert(strcmp(version.status, 'RELEASED'), version.status)   % superseded or withdrawn: decide, do not drift
D = version.correlation.evaluate.diffusivities               % m²/s`;

const WRITERS: Readonly<Record<Language, (example: ExampleRequest) => string>> = {
  curl,
  Python: python,
  JavaScript: javascript,
  MATLAB: matlab,
};

/** A program, ready to run where `DIFFOLIO_KEY` holds an API key, that asks for D and U at these states. */
export const codeExample = (language: Language, example: ExampleRequest): string => WRITERS[language](example);

interface Validity {
  readonly temperatureMinimum: number;
  readonly temperatureMaximum: number;
  readonly pressureMinimum: number;
  readonly pressureMaximum: number;
}

const ATMOSPHERE = 101_325;

/** Two round temperatures and a pressure inside the range. */
export function statesInside(validity: Validity): Pick<ExampleRequest, 'temperatures' | 'pressure'> {
  const { temperatureMinimum: low, temperatureMaximum: high, pressureMinimum, pressureMaximum } = validity;
  const at = (share: number) => {
    const exact = low + share * (high - low);
    const round = Math.round(exact / 5) * 5;
    return round >= low && round <= high ? round : Number(exact.toFixed(2));
  };
  const pressure = ATMOSPHERE >= pressureMinimum && ATMOSPHERE <= pressureMaximum ? ATMOSPHERE : pressureMinimum;
  return { temperatures: [at(0.25), at(0.75)], pressure };
}
