# Text files compiled into the program, so that it needs no data file beside it. Nothing is read or copied at start.

# raw_literals(RESULT FILE): the file's content as C++ string literals in RESULT; the build is configured again when it
# changes.
function(raw_literals result file)
    set_property(DIRECTORY APPEND PROPERTY CMAKE_CONFIGURE_DEPENDS ${file})
    file(READ ${file} content)
    # Compilers limit the length of one literal; adjacent literals are joined.
    string(LENGTH "${content}" length)
    set(literals "")
    set(start 0)
    while(start LESS length)
        string(SUBSTRING "${content}" ${start} 12000 piece)
        string(APPEND literals "R\"embedded(${piece})embedded\"\n")
        math(EXPR start "${start} + 12000")
    endwhile()
    set(${result} "${literals}" PARENT_SCOPE)
endfunction()

# embed_text(TARGET SYMBOL FILE): compiles a text file into TARGET as `std::string_view SYMBOL()` of namespace
# quasistat::resources.
function(embed_text target symbol file)
    set(generated ${CMAKE_CURRENT_BINARY_DIR}/embedded_${symbol}.cpp)
    raw_literals(literals ${file})
    file(CONFIGURE OUTPUT ${generated} @ONLY CONTENT
"#include <string_view>
namespace quasistat::resources {
std::string_view @symbol@();
std::string_view @symbol@()
{
    return
@literals@;
}
} // namespace quasistat::resources
")
    target_sources(${target} PRIVATE ${generated})
endfunction()

# embed_folder(TARGET SYMBOL FOLDER): compiles all FOLDER/*.json into TARGET as `std::span<const EmbeddedText> SYMBOL()`
# (resources/embedded_text.h), sorted by name. A file's name, "_" read as a blank, is the name of its text.
function(embed_folder target symbol folder)
    set(generated ${CMAKE_CURRENT_BINARY_DIR}/embedded_${symbol}.cpp)
    # Adding a file is all there is to adding a text.
    file(GLOB files CONFIGURE_DEPENDS ${folder}/*.json)
    set(names "")
    foreach(file IN LISTS files)
        get_filename_component(name ${file} NAME)
        string(REGEX REPLACE "[.]json$" "" name ${name})
        string(REPLACE "_" " " name ${name})
        list(APPEND names ${name})
    endforeach()
    list(SORT names)
    set(entries "")
    foreach(name IN LISTS names)
        string(REPLACE " " "_" stem ${name})
        raw_literals(literals ${folder}/${stem}.json)
        string(APPEND entries "    {\"${name}\",\n${literals}},\n")
    endforeach()
    file(CONFIGURE OUTPUT ${generated} @ONLY CONTENT
"#include \"resources/embedded_text.h\"
#include <span>
namespace quasistat::resources {
namespace {
constexpr EmbeddedText texts[] = {
@entries@};
}
std::span<const EmbeddedText> @symbol@();
std::span<const EmbeddedText> @symbol@()
{
    return texts;
}
} // namespace quasistat::resources
")
    target_sources(${target} PRIVATE ${generated})
endfunction()
