# Every text file of the suite is a test: its RUN lines say what must hold.

import os

import lit.formats
from lit.llvm import llvm_config
from lit.llvm.subst import ToolSubst

config.name = "Lull"
config.test_format = lit.formats.ShTest(not llvm_config.use_lit_shell)
config.suffixes = [".mlir", ".test"]
config.test_source_root = os.path.dirname(__file__)
config.excludes = ["Unit", "Inputs", "Bench", "CMakeLists.txt"]

llvm_config.use_default_substitutions()
# `not` and `count` are looked up there, not substituted.
llvm_config.with_environment("PATH", config.llvm_tools_dir, append_path=True)
llvm_config.with_system_environment(
    ["HOME", "TMP", "TEMP", "LLVM_PROFILE_FILE", "ASAN_OPTIONS", "UBSAN_OPTIONS"]
)

# `lit -D roundtrip=1` runs the whole suite again with every parsed module
# printed, parsed and compared, and written to bytecode and read.
opt_args = []
if lit_config.params.get("roundtrip"):
    config.name = "Lull-roundtrip"
    opt_args = ["--verify-roundtrip"]

tool_dirs = [config.lull_tools_dir, config.llvm_tools_dir]
llvm_config.add_tool_substitutions(
    [
        ToolSubst("lull-opt", extra_args=opt_args),
        ToolSubst("lull-host-opt", extra_args=opt_args),
        "lull-show",
        "lull-lsp-server",
        "mlir-opt",
        "split-file",
    ],
    tool_dirs,
)
config.substitutions += [
    ("%python", config.python_executable),
    ("%lull_src", config.lull_source_dir),
    ("%lull_build", config.lull_build_dir),
    ("%lull_tools", config.lull_tools_dir),
    (
        "%plugin_flags",
        "--load-dialect-plugin=%s/LullPlugin.so --load-pass-plugin=%s/LullPlugin.so"
        % (config.lull_lib_dir, config.lull_lib_dir),
    ),
]
if config.lull_sanitizers:
    config.available_features.add("sanitizers")
