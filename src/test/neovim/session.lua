-- A session in a real Neovim: the set-up that is shipped, findings, hover, quick fix, exit.
-- Environment: EDITOR_CLIENTS (folder of the set-ups), TEX (file to open), RULE, LINE (of the finding, from 0),
-- HOVER_AT (line:column from 0), HOVER_SHOWS, FIXED_LINE (the whole line after the fix), RESULT (file to write).
local env = vim.env
local results = {}

-- The first failure ends the session.
local function check(name, ok, got)
  table.insert(results, (ok and 'ok   ' or 'FAIL ') .. name .. (ok and '' or '; got: ' .. vim.inspect(got)))
  if not ok then
    error(name)
  end
end

local function wait(condition)
  return (vim.wait(60000, condition, 20))
end

local function get_clients()
  return (vim.lsp.get_clients or vim.lsp.get_active_clients)()
end

local exit_code

local function set_up()
  local options = {
    on_exit = function(code)
      exit_code = code
    end,
  }
  if vim.lsp.config then
    vim.opt.runtimepath:prepend(env.EDITOR_CLIENTS .. '/neovim')
    vim.lsp.config('irreproof', options)
    vim.lsp.enable('irreproof')
  else
    dofile(env.EDITOR_CLIENTS .. '/neovim/legacy.lua').setup(options)
  end
end

local function findings(buffer)
  local line = tonumber(env.LINE)
  return vim.tbl_filter(function(diagnostic)
    local code = diagnostic.code or diagnostic.user_data.lsp.code
    return diagnostic.lnum == line and code == env.RULE
  end, vim.diagnostic.get(buffer))
end

-- What the editor shows in its floating window.
local function float_text()
  for _, window in ipairs(vim.api.nvim_list_wins()) do
    if vim.api.nvim_win_get_config(window).relative ~= '' then
      return table.concat(vim.api.nvim_buf_get_lines(vim.api.nvim_win_get_buf(window), 0, -1, false), '\n')
    end
  end
  return ''
end

local function apply_quick_fix()
  if vim.fn.has('nvim-0.8') == 1 then
    vim.lsp.buf.code_action({ apply = true, context = { only = { 'quickfix' }, diagnostics = {} } })
  else
    vim.ui.select = function(items, _, choose)
      choose(items[1], 1)
    end
    vim.lsp.buf.code_action({ only = { 'quickfix' } })
  end
end

local function session()
  vim.cmd('filetype on | set hidden noswapfile')
  set_up()
  vim.cmd('edit ' .. vim.fn.fnameescape(env.TEX))
  local buffer = vim.api.nvim_get_current_buf()
  check('the finding is shown', wait(function()
    return #findings(buffer) == 1
  end), vim.diagnostic.get(buffer))
  local before = #vim.diagnostic.get(buffer)

  local line, column = env.HOVER_AT:match('(%d+):(%d+)')
  vim.api.nvim_win_set_cursor(0, { tonumber(line) + 1, tonumber(column) })
  vim.lsp.buf.hover()
  check('hover shows ' .. env.HOVER_SHOWS, wait(function()
    return float_text():find(env.HOVER_SHOWS, 1, true) ~= nil
  end), float_text())

  local found = findings(buffer)[1]
  vim.api.nvim_win_set_cursor(0, { found.lnum + 1, found.col })
  apply_quick_fix()
  local function fixed_line()
    return vim.api.nvim_buf_get_lines(buffer, found.lnum, found.lnum + 1, false)[1]
  end
  check('the quick fix mends the line', wait(function()
    return fixed_line() == env.FIXED_LINE
  end), fixed_line())
  check('the finding goes', wait(function()
    return #findings(buffer) == 0
  end), vim.diagnostic.get(buffer))
  check('no finding comes', #vim.diagnostic.get(buffer) == before - 1, vim.diagnostic.get(buffer))

  check('there is one server', #get_clients() == 1, #get_clients())
  local client = get_clients()[1]
  if vim.fn.has('nvim-0.11') == 1 then
    client:stop()
  else
    client.stop()
  end
  check('the server exits with 0', wait(function()
    return exit_code ~= nil
  end) and exit_code == 0, exit_code)
end

local ok, problem = pcall(session)
if not ok then
  table.insert(results, 'stopped: ' .. tostring(problem))
end
vim.fn.writefile(results, env.RESULT)
vim.cmd(ok and 'qall!' or 'cquit!')
