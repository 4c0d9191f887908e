#include "core/analysis/phase_lines.h"

namespace quasistat::analysis
{

PhaseLines phaseLines(const gas::State &)
{
    return {};
}

} // namespace quasistat::analysis
