export const HELP = `datestone: how far does a claim that an alignment dates a building depend on how exactly it was built?

  datestone audit FILE… [--as FORMATS] [--template NAME|PATH] [--out DIR]
      Audits each claim file and writes the audit beside it, or into DIR:
      FILE.yaml gives FILE.audit.pdf, FILE.audit.md with its figures as SVG, FILE.audit.json.
      --as        which of pdf, md, json, with commas between; default: pdf,md
      --template  a built-in template (audit), or the path of your own
  datestone check FILE…
      Tells what is wrong with each claim file, and writes nothing.
  datestone new FILE
      Writes a claim file with comments, to fill in. An existing file is left alone.
  datestone --help | --version

Example:
  datestone new court.yaml            fill it in, then
  datestone check court.yaml
  datestone audit court.yaml --as pdf,md,json --out audits

Exit status: 0 done; 1 a claim file or a template has errors; 2 the command line is wrong;
3 a file cannot be read or written.
`
