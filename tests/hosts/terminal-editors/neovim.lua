-- Neovim 0.7 and later, headless: attach the server to a note, read its findings and its card, apply the first fix.
local command = vim.split(os.getenv('LSP_CMD'), ' ')
vim.cmd('edit trial.md')
vim.bo.filetype = 'markdown'
local client = vim.lsp.start_client({
  name = 'oxomargin',
  cmd = command,
  root_dir = vim.fn.getcwd(),
  get_language_id = function() return 'markdown' end,
})
vim.lsp.buf_attach_client(0, client)

local function check(name, holds, seen)
  io.stdout:write((holds and 'ok   ' or 'FAIL ') .. name .. ' ' .. tostring(seen or ''):gsub('\n', ' ') .. '\n')
  if not holds then vim.cmd('cquit 1') end
end
local function ask(method, params)
  for _, reply in pairs(vim.lsp.buf_request_sync(0, method, params, 10000) or {}) do return reply.result end
end
local function codes()
  return table.concat(vim.tbl_map(function(found) return found.message end, vim.diagnostic.get(0)), ' | ')
end

check('findings', vim.wait(20000, function() return codes():find('chloral') ~= nil end, 50), codes())
vim.api.nvim_win_set_cursor(0, { 3, 2 })
local hover = ask('textDocument/hover', vim.lsp.util.make_position_params())
check('card', hover and hover.contents.value:find('hydrate') and not hover.contents.value:find('data:image'), hover and hover.contents.value:sub(1, 80))
local params = vim.lsp.util.make_range_params()
params.context = { diagnostics = {}, only = { 'quickfix' } }
local actions = ask('textDocument/codeAction', params)
check('fixes', actions and #actions > 0, actions and actions[1].title)
vim.lsp.util.apply_workspace_edit(actions[1].edit, vim.lsp.get_client_by_id(client).offset_encoding)
check('applied', vim.fn.getline(3):find('16%.[56]'), vim.fn.getline(3))
check('findings gone', vim.wait(10000, function() return codes():find('not 100 mmol') == nil end, 50), codes())
vim.lsp.stop_client(client)
vim.wait(300)
vim.cmd('qa!')
