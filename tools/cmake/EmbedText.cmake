# Writes the FILES (a list) into OUT as rows of `{name, text}`, each text in raw
# string literals. The delimiter is one that no device file contains.
set(rows "")
foreach(file ${FILES})
  get_filename_component(name ${file} NAME_WE)
  file(READ ${file} text)
  string(APPEND rows "{\"${name}\", R\"~device~(${text})~device~\"},\n")
endforeach()
file(WRITE ${OUT} "${rows}")
