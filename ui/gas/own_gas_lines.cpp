// The gases of the user's own in the editor of the gas.

#include "ui/fields/text_field.h"
#include "ui/gas/gas_editor.h"
#include "ui/look/type.h"
#include "ui/session/sentences.h"

#include <QHBoxLayout>
#include <QVBoxLayout>

namespace quasistat::ui
{

void GasEditor::fitOwnLines()
{
    while (m_ownLines.size() > m_own.size()) {
        m_ownLines.back().form->forgetTyping(); // a field that goes away must not enter its text
        m_ownLines.back().holder->hide();
        m_ownLines.back().holder->deleteLater();
        m_ownLines.pop_back();
    }
    while (m_ownLines.size() < m_own.size()) addOwnLine();
    for (std::size_t i = 0; i < m_own.size(); ++i) showOwn(i);
}

void GasEditor::addOwnLine()
{
    const std::size_t index = m_ownLines.size();
    OwnLine line;
    line.holder = new QWidget(this);
    auto *column = new QVBoxLayout(line.holder);
    column->setContentsMargins(0, 6, 0, 0);
    column->setSpacing(4);
    auto *head = new QHBoxLayout;
    auto *title = new QLabel(tr("Gas of your own"), line.holder);
    title->setFont(bodyFace());
    auto *remove = new QPushButton(tr("Remove"), line.holder);
    remove->setObjectName(QStringLiteral("own%1.remove").arg(index + 1));
    remove->setProperty("role", QStringLiteral("quiet"));
    remove->setFont(bodyFace());
    head->addWidget(title);
    head->addStretch();
    head->addWidget(remove);
    line.form = new FormView(line.holder);
    line.form->setRejectsInvalid(true);
    line.words = new QLabel(line.holder);
    line.words->setFont(labelFace());
    line.words->setWordWrap(true);
    line.words->setProperty("role", QStringLiteral("secondary"));
    column->addLayout(head);
    column->addWidget(line.form);
    column->addWidget(line.words);
    connect(remove, &QPushButton::clicked, this, [this, index] { removeOwn(index); });
    connect(line.form, &FormView::entered, this,
            [this, index](const QString &id, const QString &text) { takeOwn(index, id, text); });
    connect(line.form, &FormView::escaped, this, &GasEditor::escaped);
    auto *whole = qobject_cast<QVBoxLayout *>(layout());
    whole->insertWidget(whole->indexOf(m_addOwn), line.holder);
    line.holder->show();
    m_ownLines.push_back(line);
}

bool GasEditor::isKnown(const OwnGas &gas) const
{
    return m_session.library().componentName(gas.name.toStdString(), "peng-robinson").ok();
}

void GasEditor::showOwn(std::size_t index)
{
    m_ownLines[index].form->setForm(ownGasForm(m_own[index]));
    const QString missing = stillMissing(m_own[index], isKnown(m_own[index]));
    m_ownLines[index].words->setText(tr("Still needed: %1.").arg(missing));
    m_ownLines[index].words->setVisible(!missing.isEmpty());
}

void GasEditor::takeOwn(std::size_t index, const QString &id, const QString &text)
{
    const QString before = m_own[index].name;
    m_own[index] = ownGasEntered(m_own[index], *m_ownLines[index].form->field(id), text);
    showOwn(index);
    applyOwn(before, m_own[index].name);
}

void GasEditor::removeOwn(std::size_t index)
{
    for (const OwnLine &line : m_ownLines) line.form->forgetTyping();
    m_own.erase(m_own.begin() + static_cast<std::ptrdiff_t>(index));
    fitOwnLines();
    applyOwn();
}

void GasEditor::applyOwn(const QString &renamedFrom, const QString &renamedTo)
{
    // One that is still being written waits, or stays as it was; the others stand.
    const std::vector<OwnGas> stated = ownGases(m_session.base().design);
    std::vector<OwnGas> ready;
    for (const OwnGas &gas : m_own) {
        const auto before = std::ranges::find(stated, gas.name, &OwnGas::name);
        if (stillMissing(gas, isKnown(gas)).isEmpty())
            ready.push_back(gas);
        else if (before != stated.end())
            ready.push_back(*before);
    }
    document::Design design = withOwnGases(m_session.base().design, ready);
    if (!renamedFrom.isEmpty() && renamedFrom != renamedTo) design = renamedInMixture(design, renamedFrom, renamedTo);
    m_shownOwn = ready; // what is being written stays though the document changes
    m_session.apply(design, tr("Change a gas of your own"));
}

} // namespace quasistat::ui
