# embed_text(TARGET SYMBOL FILE): compiles a text file into TARGET as `std::string_view SYMBOL()` of namespace
# quasistat::resources, so that the program needs no data file beside it.
function(embed_text target symbol file)
    set(generated ${CMAKE_CURRENT_BINARY_DIR}/embedded_${symbol}.cpp)
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
