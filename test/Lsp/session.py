"""Drives lull-lsp-server through a session by the Language Server Protocol:
initialize, open a file with a mistake, read its diagnostics, shut down.

Usage: session.py SERVER
"""

import json
import subprocess
import sys

BAD = """func.func @f() {
  %q0 = lull.qubit 0
  lull.gate cx %q0, %q0 for 64 dt
  return
}
"""


def main():
    server = subprocess.Popen(
        [sys.argv[1]], stdin=subprocess.PIPE, stdout=subprocess.PIPE
    )

    def send(message):
        body = json.dumps({"jsonrpc": "2.0", **message}).encode()
        server.stdin.write(b"Content-Length: %d\r\n\r\n" % len(body) + body)
        server.stdin.flush()

    def receive():
        length = 0
        while line := server.stdout.readline().strip():
            name, value = line.split(b":")
            if name.lower() == b"content-length":
                length = int(value)
        return json.loads(server.stdout.read(length))

    def receive_until(wanted):
        while True:
            message = receive()
            if wanted(message):
                return message

    send({"id": 1, "method": "initialize", "params": {"capabilities": {}}})
    answer = receive_until(lambda m: m.get("id") == 1)
    print("hover", answer["result"]["capabilities"]["hoverProvider"])
    send({"method": "initialized", "params": {}})
    document = {"uri": "file:///f.mlir", "languageId": "mlir", "version": 1}
    send(
        {
            "method": "textDocument/didOpen",
            "params": {"textDocument": {**document, "text": BAD}},
        }
    )
    found = receive_until(
        lambda m: m.get("method") == "textDocument/publishDiagnostics"
    )
    for diagnostic in found["params"]["diagnostics"]:
        line = diagnostic["range"]["start"]["line"] + 1
        print("line %d: %s" % (line, diagnostic["message"]))
    send({"id": 2, "method": "shutdown"})
    receive_until(lambda m: m.get("id") == 2)
    send({"method": "exit"})
    print("exit", server.wait(timeout=60))


main()
