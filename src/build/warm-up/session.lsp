Content-Length: 306

{"jsonrpc":"2.0","id":1,"method":"initialize","params":{"processId":null,"rootUri":null,"capabilities":{"textDocument":{"hover":{"contentFormat":["markdown","plaintext"]},"codeAction":{"codeActionLiteralSupport":{"codeActionKind":{"valueSet":["quickfix"]}}},"publishDiagnostics":{"versionSupport":true}}}}}Content-Length: 52

{"jsonrpc":"2.0","method":"initialized","params":{}}Content-Length: 417

{"jsonrpc":"2.0","method":"textDocument/didOpen","params":{"textDocument":{"uri":"file:///nowhere/warm-up.tex","languageId":"latex","version":1,"text":"\\documentclass{article}\n\\newcommand{\\rep}[1]{\\mathbf{#1}}\n\\begin{document}\nIn SU(3),\n\\begin{align}\n\\rep{3}\\otimes\\bar{\\rep{3}} &= \\rep{1}\\oplus\\rep{8}, \\\\\n\\rep{3}\\otimes\\rep{3} &= \\rep{6}\\oplus\\rep{3}.\n\\end{align}\n\\end{document}\n"}}}Content-Length: 154

{"jsonrpc":"2.0","id":2,"method":"textDocument/hover","params":{"textDocument":{"uri":"file:///nowhere/warm-up.tex"},"position":{"line":6,"character":2}}}Content-Length: 228

{"jsonrpc":"2.0","id":3,"method":"textDocument/codeAction","params":{"textDocument":{"uri":"file:///nowhere/warm-up.tex"},"range":{"start":{"line":6,"character":30},"end":{"line":6,"character":31}},"context":{"diagnostics":[]}}}